import { expect, test } from './support';

test.use({ role: 'trainer' });

test('a flag is decided by keyboard, the next one has the focus, and the decision is taken back', async ({ page }) => {
  await page.goto('/flags');
  const list = page.getByRole('list').filter({ has: page.getByRole('button', { name: 'Decide' }) });
  // The renewal of a fresh demo may still be on its way.
  const items = page.getByRole('listitem', { name: /, open$/ });
  await expect(items.first()).toBeVisible({ timeout: 45_000 });
  await expect(list).toBeVisible();
  const name = async (nth: number) => (await items.nth(nth).getAttribute('aria-label')) ?? '';
  const [first, second] = [await name(0), await name(1)];

  await page.keyboard.press('j');
  await expect(page.getByRole('listitem', { name: first, exact: true })).toBeFocused();
  await page.keyboard.press('d');
  const decisions = page.getByRole('group', { name: /^What / });
  await expect(decisions.getByRole('button', { name: /Leaked before/ })).toBeFocused();
  await page.keyboard.press('Escape');
  await expect(decisions).toBeHidden();

  await page.keyboard.press('d');
  await page.keyboard.press('6');
  const told = page.getByRole('status').filter({ hasText: 'confirmed correct' });
  await expect(told).toContainText(first.replace(', open', ''));
  await expect(page.getByRole('listitem', { name: first, exact: true })).toBeHidden();
  await expect(page.getByRole('listitem', { name: second, exact: true })).toBeFocused();

  await told.getByRole('button', { name: 'Reopen' }).click();
  await expect(told).toBeHidden();
  await expect(page.getByRole('listitem', { name: first, exact: true })).toBeVisible();
});

test('a record shows its flags, and an entry error leaves the figures until it is reopened', async ({ page }) => {
  await page.goto('/flags?rule=duplicate');
  const item = page.getByRole('listitem', { name: /, open$/ }).first();
  await item.getByRole('link').first().click();
  await expect(page).toHaveURL(/\/records\//);
  const flags = page.getByRole('region', { name: 'Flags' });
  await expect(flags).toContainText('Written twice?');
  await flags.getByRole('button', { name: 'Decide' }).click();
  await flags.getByRole('button', { name: /Weighing or entry error/ }).click();
  await expect(flags.getByText('Weighing or entry error')).toBeVisible();
  await expect(page.getByText('Left out of the figures as an entry error', { exact: true })).toBeVisible();
  await flags.getByRole('button', { name: 'Reopen' }).click();
  await expect(flags.getByRole('button', { name: 'Decide' })).toBeVisible();
  await expect(page.getByText('Left out of the figures as an entry error', { exact: true })).toBeHidden();
});

test.describe('a technician', () => {
  test.use({ role: 'technician' });

  test('sees the flags of his own records and decides none', async ({ page }) => {
    await page.goto('/flags');
    await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
    await expect(page.getByRole('button', { name: 'Decide' })).toHaveCount(0);
  });
});
