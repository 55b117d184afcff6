import { expect, test } from './support';

test.use({ role: 'operations' });

test('each part of the sentence is set in place, kept in the address and undone by Back', async ({ page, faults }) => {
  await page.goto('/trends');
  await page.getByRole('button', { name: 'all refrigerants' }).click();
  // Nobody types the hyphen.
  await page.getByPlaceholder('Find a refrigerant').fill('r22');
  await page.keyboard.press('Enter');
  await page.getByRole('button', { name: 'Show', exact: true }).click();
  await expect(page).toHaveURL(/\/trends\?refrigerant=R-22$/);
  await expect(page.getByText(/^Recoveries from all branches, of R.22, by all technicians,/)).toBeVisible();
  await page.goBack();
  await expect(page).toHaveURL(/\/trends$/);
  await expect(page.getByRole('button', { name: 'all refrigerants' })).toBeVisible();
  expect(faults).toEqual([]);
});

test('the scope goes along to another screen', async ({ page, faults }) => {
  await page.goto('/trends?refrigerant=R-22&refrigerant=R-410A&unit=kg');
  await page.getByRole('navigation').getByRole('link', { name: 'Technicians' }).click();
  await expect(page).toHaveURL(/\/technicians\?refrigerant=R-22&refrigerant=R-410A&unit=kg/);
  expect(faults).toEqual([]);
});

test('a name that no record has is said and can be taken out', async ({ page, faults }) => {
  await page.goto('/trends?refrigerant=R-999');
  await page.getByRole('button', { name: /^R.999/ }).click();
  const unknown = page.getByRole('option', { name: /R.999/ });
  await expect(unknown).toContainText('not known here');
  await unknown.click();
  await page.getByRole('button', { name: 'Show', exact: true }).click();
  await expect(page).toHaveURL(/\/trends$/);
  expect(faults).toEqual([]);
});

test.describe('on a phone', () => {
  test.use({ viewport: { width: 320, height: 640 }, hasTouch: true });

  test('the screens lie at the thumb and nothing but tables scrolls sideways', async ({ page, faults }) => {
    await page.goto('/trends');
    const bar = page.getByRole('navigation', { name: 'Screens' });
    await expect(bar.getByRole('link', { name: 'Technicians' })).toBeInViewport();
    await bar.getByRole('button', { name: 'More' }).click();
    await expect(page.getByRole('dialog', { name: 'More' }).getByRole('button', { name: 'Sign out' })).toBeVisible();
    await page.keyboard.press('Escape');
    const beyond = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
    expect(beyond).toBeLessThanOrEqual(0);
    expect(faults).toEqual([]);
  });
});
