import { readFile } from 'node:fs/promises';
import AxeBuilder from '@axe-core/playwright';
import type { Page } from '@playwright/test';
import { expect, test } from './support';

test.use({ role: 'operations' });
test.describe.configure({ timeout: 120_000 });

const panelOf = (page: Page) => page.getByRole('dialog');
const plain = (text: string | null) => (text ?? '').replace(/\s/g, ' ').replace(/[^\x20-\x7e]/g, '-');

/** Opens the figure that heads the screen of trends. */
const openAnswer = async (page: Page) => {
  await page.goto('/trends');
  const figure = page.getByRole('heading', { level: 1 }).getByRole('link');
  // Behind the panel the screen is hidden from who reads by roles.
  const said = await figure.textContent();
  await figure.click();
  await expect(panelOf(page).getByRole('table')).toBeVisible();
  return said;
};

test('a figure opens beside the screen, closes by Back, and its address shows it to a colleague', async ({ page }) => {
  const said = await openAnswer(page);
  await expect(page).toHaveURL(/\/trends\?open=recoveredMass&open\.month=\d{4}-\d{2}$/);
  const address = page.url();
  const head = plain(await panelOf(page).getByRole('heading').textContent());
  const told = plain(
    await panelOf(page)
      .getByText(/together/)
      .textContent(),
  );
  // The figure of the panel, the sum of its records and the figure of the sentence are one.
  expect(told).toMatch(/^\d+ recoveries, together [\d,.]+ lb$/);
  expect(head.startsWith(told.replace(/^.*together /, ''))).toBe(true);
  const rounded = Math.round(Number(head.match(/[\d,.]+/)?.[0].replace(',', '')));
  expect(plain(said)).toBe(`${rounded.toLocaleString('en-US')} lb`);
  await page.goBack();
  await expect(panelOf(page)).toBeHidden();
  await expect(page).toHaveURL(/\/trends$/);
  await page.goto(address);
  await expect(panelOf(page).getByRole('heading')).toHaveText(/recovered mass/);
  expect(
    plain(
      await panelOf(page)
        .getByText(/together/)
        .textContent(),
    ),
  ).toBe(told);
});

test('the panel is closed by Esc and the keyboard is back at the figure', async ({ page }) => {
  await page.goto('/technicians');
  const figure = page.getByRole('table').getByRole('row').nth(1).getByRole('link', { name: /%$/ });
  await figure.focus();
  await page.keyboard.press('Enter');
  await expect(panelOf(page)).toBeVisible();
  await expect(page).toHaveURL(/open=medianYield.*open\.technician=/);
  await page.keyboard.press('Escape');
  await expect(panelOf(page)).toBeHidden();
  await expect(page).toHaveURL(/\/technicians$/);
  await expect(figure).toBeFocused();
});

test('a record opened out of a panel leads back to it', async ({ page }) => {
  await openAnswer(page);
  const address = page.url();
  await panelOf(page).getByRole('table').getByRole('row').nth(1).getByRole('link').click();
  await expect(page).toHaveURL(/\/records\/[0-9a-f-]{36}\?.*exclusion=none/);
  await page.goBack();
  await expect(page).toHaveURL(address);
  await expect(panelOf(page)).toBeVisible();
});

test('rows are sorted in the panel without a step in the history', async ({ page }) => {
  await openAnswer(page);
  const rows = panelOf(page).getByRole('table').getByRole('row');
  await panelOf(page)
    .getByRole('button', { name: /Recovered, lb/ })
    .click();
  await expect(panelOf(page).getByRole('columnheader', { name: /Recovered, lb/ })).toHaveAttribute(
    'aria-sort',
    'descending',
  );
  await expect(panelOf(page).locator('[aria-busy=true]')).toHaveCount(0);
  const massOf = async (row: number) =>
    Number((await rows.nth(row).getByRole('cell').nth(6).textContent())?.replace(',', ''));
  expect(await massOf(1)).toBeGreaterThanOrEqual(await massOf(2));
  await page.goBack();
  await expect(panelOf(page)).toBeHidden();
});

test('a second click on a bar opens its month', async ({ page }) => {
  await page.goto('/trends');
  const chart = page.getByRole('slider', { name: 'Recovered mass by month' });
  await expect(chart.locator('svg').first()).toBeVisible();
  const box = await chart.boundingBox();
  if (!box) throw new Error('The chart has no box.');
  const [x, y] = [box.x + box.width * 0.4, box.y + box.height * 0.5];
  // The first click holds the month, the second opens it.
  await page.mouse.click(x, y);
  await expect(page).toHaveURL(/\/trends$/);
  await page.mouse.click(x, y);
  await expect(page).toHaveURL(/open=recoveredMass&open\.month=/);
  await expect(panelOf(page)).toBeVisible();
});

test('a chart is taken away as CSV and as Excel', async ({ page }) => {
  await page.goto('/trends?from=2026-01&to=2026-03&unit=kg');
  const sheet = page.getByRole('region', { name: 'Recovered mass by month' });
  const taken = async (name: string) => {
    const download = page.waitForEvent('download');
    await sheet.getByRole('button', { name }).click();
    return download;
  };
  const csv = await taken('CSV');
  expect(csv.suggestedFilename()).toMatch(/^recovered-mass-by-month-\d{4}-\d\d-\d\d\.csv$/);
  const lines = (await readFile(await csv.path(), 'utf8')).trim().split('\r\n');
  expect(lines[0]).toMatch(/^\uFEFF?Month,Month is,.*"All, kg"/);
  expect(lines.slice(1).map((line) => line.split(',')[0])).toEqual(['2026-01', '2026-02', '2026-03']);
  const xlsx = await taken('Excel');
  expect(xlsx.suggestedFilename()).toMatch(/\.xlsx$/);
  // A zip file begins so.
  expect((await readFile(await xlsx.path())).subarray(0, 2).toString()).toBe('PK');
});

for (const colorScheme of ['light', 'dark'] as const)
  test.describe(`in ${colorScheme}`, () => {
    test.use({ colorScheme });
    test('the panel has no barrier', async ({ page }) => {
      await openAnswer(page);
      const { violations } = await new AxeBuilder({ page }).include('[role=dialog]').analyze();
      expect(
        violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ target }) => target.join(' ')).join(', ')}`),
      ).toEqual([]);
    });
  });

test.describe('on a phone', () => {
  test.use({ viewport: { width: 390, height: 844 }, hasTouch: true });
  test('the panel fills the screen and nothing is cut off at its sides', async ({ page }) => {
    await page.goto('/trends');
    await page.getByRole('heading', { level: 1 }).getByRole('link').click();
    await expect(panelOf(page).getByRole('list', { name: 'Records' })).toBeVisible();
    // Once it has slid in.
    await expect.poll(() => panelOf(page).boundingBox()).toMatchObject({ x: 0, width: 390, height: 844 });
    const beyond = await panelOf(page).evaluate((panel) =>
      [panel, ...panel.querySelectorAll('*')].some((part) => part.getBoundingClientRect().right > 391),
    );
    expect(beyond).toBe(false);
  });
});
