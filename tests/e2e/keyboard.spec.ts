import type { Locator, Page } from '@playwright/test';
import { expect, signInOf, tableOf, test } from './support';

/** Presses Tab until the wanted element has the focus; a page that traps the keyboard fails here. */
const tabTo = async (page: Page, wanted: Locator, most = 60): Promise<void> => {
  for (let presses = 0; presses < most; presses++) {
    await page.keyboard.press('Tab');
    if (await wanted.evaluate((element) => element === document.activeElement)) return;
  }
  throw new Error(`${most} presses of Tab did not reach ${wanted}.`);
};

test('the main job needs no mouse', async ({ page }) => {
  const { email, password } = signInOf('operations');
  await page.goto('/sign-in?next=%2Ftrends');
  await tabTo(page, page.getByLabel('E-mail'));
  await page.keyboard.type(email);
  await page.keyboard.press('Tab');
  await page.keyboard.type(password);
  await page.keyboard.press('Enter');
  await expect(page).toHaveURL(/\/trends/);
  const months = tableOf(page, /Recovered mass by month/);
  await expect(months).toBeVisible();

  // The first stop of a page skips what every page repeats.
  await page.reload();
  await expect(months).toBeVisible();
  await page.keyboard.press('Tab');
  await expect(page.getByRole('link', { name: 'Skip to the content' })).toBeFocused();
  await page.keyboard.press('Enter');
  await expect(page.getByRole('main')).toBeFocused();

  // A part of the scope opens, is chosen from and closes, and the focus is where it was.
  const part = page.getByRole('button', { name: 'all refrigerants' });
  await tabTo(page, part);
  await page.keyboard.press('Enter');
  const editor = page.getByRole('dialog', { name: 'Refrigerants' });
  await expect(editor).toBeVisible();
  await page.keyboard.press('Escape');
  await expect(editor).toBeHidden();
  await expect(part).toBeFocused();
  await page.keyboard.press('Enter');
  await expect(editor.getByRole('option').first()).toBeVisible();
  await page.keyboard.press('ArrowDown');
  await page.keyboard.press('Enter');
  await tabTo(page, editor.getByRole('button', { name: 'Show', exact: true }));
  await page.keyboard.press('Enter');
  await expect(page).toHaveURL(/refrigerant=/);

  // The chart is one stop: the first arrow begins at the last month, the next ones move, Enter opens the records of the month.
  const chart = page.getByRole('slider', { name: 'Recovered mass by month' });
  await tabTo(page, chart);
  await page.keyboard.press('ArrowLeft');
  const before = await chart.getAttribute('aria-valuetext');
  await page.keyboard.press('ArrowLeft');
  await expect(chart).not.toHaveAttribute('aria-valuetext', before ?? '');
  await page.keyboard.press('Enter');
  await expect(page).toHaveURL(/refrigerant=.*open=recoveredMass&open\.month=/);
  await expect(tableOf(page, 'Records')).toBeVisible();
  await page.keyboard.press('Escape');
  await expect(page).not.toHaveURL(/open=/);
  await expect(chart).toBeFocused();
});
