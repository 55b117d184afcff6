import type { Locator, Page } from '@playwright/test';
import { type FileRow, RECOVERY_FILE, REFUSED, sumOf, TAKEN } from './recovery-file';
import { expect, signInOf, tableOf, test } from './support';

test.describe.configure({ timeout: 120_000 });

const rowOf = (page: Page, table: RegExp, head: string | RegExp): Locator =>
  tableOf(page, table)
    .getByRole('row')
    .filter({ has: page.getByRole('rowheader', { name: head }) });

/** The number in a row under the column of this name, thousands separated by commas; NaN while there is none. */
const numberIn = async (page: Page, table: RegExp, head: string | RegExp, column: RegExp): Promise<number> => {
  const heads = await tableOf(page, table).getByRole('columnheader').allTextContents();
  // A heading may begin with the mark that opens its meaning.
  const at = heads.findIndex((text) => column.test(text.replace(/\s+/g, ' ').replace(/^[?\s]+/, '')));
  const cells = await rowOf(page, table, head).locator('th, td').allTextContents();
  return Number(cells[at]?.replaceAll(',', ''));
};

/** What a row must show, once the figures of the scope are there. Masses are shown to the tenth of a pound. */
const expectRow = async (
  page: Page,
  [table, head]: readonly [table: RegExp, head: string | RegExp],
  { massLb, recoveries }: { massLb: number; recoveries: number },
): Promise<void> => {
  await expect.poll(() => numberIn(page, table, head, /^Recoveries/)).toBe(recoveries);
  await expect
    .poll(async () => Math.abs((await numberIn(page, table, head, /^(All|Recovered)/)) - massLb))
    .toBeLessThanOrEqual(0.0501);
};

const FEBRUARY = [/Recovered mass by month/, /Feb 2015/] as const;
const inFebruary = (row: FileRow) => row.recovered_at.startsWith('2015-02');

test('an operations manager brings a file in and finds it in every screen', async ({ page }) => {
  await test.step('sign in', async () => {
    const { email, password } = signInOf('newcomer');
    await page.goto('/');
    await page.getByLabel('E-mail').fill(email);
    await page.getByLabel('Password', { exact: true }).fill(password);
    await page.getByRole('button', { name: 'Sign in' }).click();
    await expect(page).not.toHaveURL(/sign-in/);
    await expect(page.getByText('No records yet')).toBeVisible();
  });

  await test.step('hand the file in and see what it would change', async () => {
    await page.getByRole('link', { name: 'Bring in a file' }).click();
    await page.getByLabel(/Choose a file/).setInputFiles(RECOVERY_FILE);
    await expect(page.getByRole('heading', { level: 1 })).toHaveText('398 of 400 rows would change your records');
    for (const ref of REFUSED) await expect(page.getByRole('region', { name: 'Refused rows' })).toContainText(ref);
    await expect(page.getByRole('heading', { name: 'Names that would be new' })).toBeVisible();
  });

  await test.step('nothing is taken before it is told to', async () => {
    const records = await page.request.get('/api/recoveries');
    expect(await records.json()).toMatchObject({ total: 0 });
  });

  await test.step('take it in', async () => {
    await page.getByRole('button', { name: 'Take in 398 rows' }).first().click();
    await expect(page.getByRole('heading', { level: 1 })).toContainText('398 records came in', { timeout: 60_000 });
  });

  await test.step('Trends shows the months of the file to the hundredth', async () => {
    await page.getByRole('navigation', { name: 'Screens' }).getByRole('link', { name: 'Trends' }).click();
    await page.getByRole('button', { name: 'Show the whole time' }).click();
    await expect(page).toHaveURL(/from=2015-01&to=2016-02/);
    await expectRow(page, FEBRUARY, sumOf(inFebruary));
  });

  await test.step('a narrower scope stands in the address, and the figures follow', async () => {
    await page.getByRole('button', { name: 'all refrigerants' }).click();
    await page.getByRole('option', { name: /R.22\b/ }).click();
    await page.getByRole('button', { name: 'Show', exact: true }).click();
    await expect(page).toHaveURL(/refrigerant=R-22/);
    await expectRow(
      page,
      FEBRUARY,
      sumOf((row) => inFebruary(row) && row.refrigerant === 'R-22'),
    );
  });

  await test.step('Back gives the wider scope again', async () => {
    await page.goBack();
    await expect(page).not.toHaveURL(/refrigerant=/);
    await expectRow(page, FEBRUARY, sumOf(inFebruary));
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
      await expectRow(
        page,
        [new RegExp(screen.slice(0, -1), 'i'), name],
        sumOf((row) => row[key] === name),
      );
    }
  });

  await test.step('a month’s figure opens exactly its records', async () => {
    await page.getByRole('navigation', { name: 'Screens' }).getByRole('link', { name: 'Trends' }).click();
    const { recoveries } = sumOf(inFebruary);
    await rowOf(page, ...FEBRUARY)
      .getByRole('link', { name: String(recoveries), exact: true })
      .click();
    await expect(page).toHaveURL(/open=recoveries&open\.month=2015-02/);
    const panel = page.getByRole('dialog');
    const told = (await panel.getByText(/, together/).textContent()) ?? '';
    expect(told.replace(/\s/g, ' ')).toContain(`${recoveries} recoveries, together `);
    const sum = Number(told.match(/together ([\d,.]+)/)?.[1]?.replace(',', ''));
    expect(Math.abs(sum - sumOf(inFebruary).massLb)).toBeLessThanOrEqual(0.0501);
    await panel.getByRole('link', { name: 'Show as a list' }).click();
    await expect(page).toHaveURL(/\/records\?/);
    await expect(page.getByRole('heading', { level: 1 })).toContainText(`${recoveries} records`);
  });

  const corrected = TAKEN.find((row) => inFebruary(row));
  const reason = 'The ticket says a pound more';

  await test.step('a record is corrected with a reason', async () => {
    await page
      .getByRole('link', { name: corrected?.record_ref ?? '' })
      .first()
      .click();
    await page.getByRole('button', { name: 'Correct this record' }).click();
    for (const field of ['End weight, lb', 'Recovered mass, lb']) {
      const input = page.getByLabel(field, { exact: true });
      await input.fill((Number(await input.inputValue()) + 1).toFixed(2));
    }
    await expect(page.getByRole('button', { name: 'Save the correction' })).toBeDisabled();
    await page.getByLabel('Why the record is corrected').fill(reason);
    await page.getByRole('button', { name: 'Save the correction' }).click();
  });

  await test.step('the history tells who, what and why', async () => {
    const entry = page.getByRole('listitem').filter({ hasText: reason });
    await expect(entry.first()).toContainText('changed by Ines Fennwick');
    await expect(entry.first()).toContainText('Recovered mass');
  });

  await test.step('the month is heavier by what was corrected', async () => {
    await page.goto('/trends?from=2015-01&to=2016-02&unit=lb');
    const { massLb, recoveries } = sumOf(inFebruary);
    await expectRow(page, FEBRUARY, { massLb: massLb + 1, recoveries });
  });

  await test.step('the import is undone, the corrected record stays', async () => {
    await page.goto('/imports');
    await page.getByRole('link', { name: 'plain.csv' }).first().click();
    await page.getByRole('button', { name: 'Undo this import' }).click();
    await page.getByRole('button', { name: 'Undo it' }).click();
    await expect(page.getByRole('heading', { level: 1 })).toContainText('was undone', { timeout: 60_000 });
    await expect(tableOf(page, 'Records that the undo kept')).toContainText(corrected?.record_ref ?? '');
    expect(await (await page.request.get('/api/recoveries')).json()).toMatchObject({ total: 1 });
  });
});
