import { expect, tableOf, test } from './support';

test.use({ role: 'operations' });

test('a note is pinned to a month, marked in chart and table, and taken away', async ({ page, faults }) => {
  await page.goto('/trends');
  const words = `Reclaimer closed ${Date.now()}`;
  await page.getByRole('button', { name: 'Add a note' }).click();
  await page.getByLabel('What is to be known').fill(words);
  await page.getByRole('button', { name: 'Save the note' }).click();

  const note = page.getByRole('listitem').filter({ hasText: words });
  await expect(note).toContainText('Desmond Achterberg');
  await expect(tableOf(page, /Recovered mass by month/).getByTitle(words)).toBeVisible();

  await note.getByRole('button', { name: 'Take away' }).click();
  await note.getByRole('button', { name: 'Yes, take it away' }).click();
  await expect(note).toBeHidden();
  expect(faults).toEqual([]);
});

test('the period is compared with another one, kept in the address', async ({ page, faults }) => {
  await page.goto('/trends?from=2026-01&to=2026-06');
  const comparison = page.getByRole('region', { name: /^January to June 2026 against/ });
  await expect(comparison).toContainText('January to June 2025');
  await comparison.getByRole('button', { name: 'January to June 2025' }).click();
  await page.getByRole('button', { name: 'The same period two years before' }).click();
  await expect(page).toHaveURL(/versus=2024-01\.\.2024-06/);
  await expect(page.getByRole('heading', { level: 1 })).toContainText('from January to June 2024');
  await expect(tableOf(page, 'January to June 2026 against January to June 2024')).toBeVisible();
  await page.goBack();
  await expect(page.getByRole('heading', { level: 1 })).toContainText('June 2026 brought in');
  expect(faults).toEqual([]);
});

test('a period that is none says so where it was asked for, and the rest stays', async ({ page, faults }) => {
  await page.goto('/trends?versus=2024-13');
  await expect(page.getByRole('alert').filter({ hasText: 'Expected months or days' })).toBeVisible();
  await expect(page.getByRole('slider', { name: 'Recovered mass by month' })).toBeVisible();
  // The browser reports the refusal itself.
  expect(faults.every((fault) => fault.includes('400'))).toBe(true);
  faults.length = 0;
});
