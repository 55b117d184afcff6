import type { Locator, Page } from '@playwright/test';
import { type FileRow, RECOVERY_FILE, REFUSED, sumOf, TAKEN } from './recovery-file';
import { expect, signInOf, test } from './support';

test.describe.configure({ timeout: 180_000 });

/** The number that a cell shows, thousands separated by commas. */
const numberIn = async (cell: Locator): Promise<number> => Number((await cell.textContent())?.replace(/[^\d.]/g, ''));

/** Masses are shown to the tenth of a pound. */
const expectMass = async (cell: Locator, massLb: number): Promise<void> => {
  expect(Math.abs((await numberIn(cell)) - massLb)).toBeLessThanOrEqual(0.0501);
};

const rowOf = (page: Page, table: RegExp, head: string | RegExp) =>
  page
    .getByRole('table', { name: table })
    .getByRole('row')
    .filter({ has: page.getByRole('rowheader', { name: head }) });

/** The cell of a row under a column of this name. */
const cellUnder = async (page: Page, table: RegExp, head: string | RegExp, column: RegExp): Promise<Locator> => {
  const heads = await page.getByRole('table', { name: table }).getByRole('columnheader').allTextContents();
  const index = heads.findIndex((text) => column.test(text.replace(/\s+/g, ' ').trim()));
  expect(index, `a column ${column} among ${heads.join(', ')}`).toBeGreaterThanOrEqual(0);
  return rowOf(page, table, head).locator('th, td').nth(index);
};

const MONTHS = /Recovered mass by month/;
const inFebruary = (row: FileRow) => row.recovered_at.startsWith('2015-02');

test('an operations manager brings a file in and finds it in every screen', async ({ page }) => {
  await test.step('sign in', async () => {
    const { email, password } = signInOf('newcomer');
    await page.goto('/');
    await page.getByLabel('E-mail').fill(email);
    await page.getByLabel('Password', { exact: true }).fill(password);
    await page.getByRole('button', { name: 'Sign in' }).click();
    await expect(page).toHaveURL(/\/trends/);
    await expect(page.getByText('No records yet')).toBeVisible();
  });

  await test.step('hand the file in and see what it would change', async () => {
    await page.getByRole('link', { name: 'Bring in a file' }).click();
    await page.getByLabel(/Choose a file/).setInputFiles(RECOVERY_FILE);
    await expect(page.getByRole('heading', { level: 1 })).toHaveText(/399 of 400 rows would change your records/);
    await expect(page.getByRole('table', { name: 'Refused rows by reason' })).toContainText(REFUSED);
    await expect(page.getByRole('heading', { name: 'Names that would be new' })).toBeVisible();
  });

  await test.step('nothing is taken before it is told to', async () => {
    const records = await page.request.get('/api/recoveries');
    expect(await records.json()).toMatchObject({ total: 0 });
  });

  await test.step('take it in', async () => {
    await page.getByRole('button', { name: 'Take in 399 rows' }).first().click();
    await expect(page.getByRole('heading', { level: 1 })).toHaveText(/399 records came in/, { timeout: 60_000 });
  });

  await test.step('Trends shows the months of the file to the hundredth', async () => {
    await page.getByRole('navigation', { name: 'Screens' }).getByRole('link', { name: 'Trends' }).click();
    await page.getByRole('button', { name: 'Show the whole time' }).click();
    await expect(page).toHaveURL(/from=2015-01&to=2016-02/);
    await expect(rowOf(page, MONTHS, /Feb 2015/)).toBeVisible();
    const { massLb, recoveries } = sumOf(inFebruary);
    await expectMass(await cellUnder(page, MONTHS, /Feb 2015/, /^All/), massLb);
    expect(await numberIn(await cellUnder(page, MONTHS, /Feb 2015/, /^Recoveries/))).toBe(recoveries);
  });

  await test.step('a narrower scope stands in the address, and the figures follow', async () => {
    await page.getByRole('button', { name: 'all refrigerants' }).click();
    await page.getByRole('option', { name: /R.22\b/ }).click();
    await page.getByRole('button', { name: 'Show', exact: true }).click();
    await expect(page).toHaveURL(/refrigerant=R-22/);
    const { massLb, recoveries } = sumOf((row) => inFebruary(row) && row.refrigerant === 'R-22');
    const cell = await cellUnder(page, MONTHS, /Feb 2015/, /^Recoveries/);
    await expect(cell).toHaveText(String(recoveries));
    await expectMass(await cellUnder(page, MONTHS, /Feb 2015/, /^All/), massLb);
  });

  await test.step('Back gives the wider scope again', async () => {
    await page.goBack();
    await expect(page).not.toHaveURL(/refrigerant=/);
    const cell = await cellUnder(page, MONTHS, /Feb 2015/, /^Recoveries/);
    await expect(cell).toHaveText(String(sumOf(inFebruary).recoveries));
  });

  await test.step('the screens of technicians and sites know the file’s names and sums', async () => {
    const screens = page.getByRole('navigation', { name: 'Screens' });
    const [first] = TAKEN;
    for (const [screen, key] of [
      ['Technicians', 'technician'],
      ['Sites', 'site'],
    ] as const) {
      await screens.getByRole('link', { name: screen }).click();
      await expect(page).toHaveURL(new RegExp(`/${screen.toLowerCase()}\\?.*from=2015-01`));
      const name = first?.[key] ?? '';
      const { massLb, recoveries } = sumOf((row) => row[key] === name);
      const table = new RegExp(screen.slice(0, -1), 'i');
      await expect(await cellUnder(page, table, name, /^Recoveries/)).toHaveText(String(recoveries));
      await expectMass(await cellUnder(page, table, name, /^Recovered/), massLb);
    }
  });

  await test.step('a month’s figure opens exactly its records', async () => {
    await page.getByRole('navigation', { name: 'Screens' }).getByRole('link', { name: 'Trends' }).click();
    const cell = await cellUnder(page, MONTHS, /Feb 2015/, /^Recoveries/);
    await cell.getByRole('link').click();
    await expect(page).toHaveURL(/\/records\?/);
    const { recoveries } = sumOf(inFebruary);
    await expect(page.getByRole('heading', { level: 1 })).toContainText(`${recoveries} records`);
  });
});
