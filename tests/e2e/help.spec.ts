import { expect, test } from './support';

test.describe('the keys', () => {
  test.use({ role: 'owner' });

  test('a question mark opens the sheet of keys, and Esc gives the screen back', async ({ page }) => {
    await page.goto('/records');
    await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
    await page.keyboard.press('?');
    const sheet = page.getByRole('dialog', { name: 'Keys' });
    await expect(sheet.getByRole('region', { name: 'In a chart' })).toContainText('open the records');
    await page.keyboard.press('Escape');
    await expect(sheet).toBeHidden();
  });

  test('a question mark typed into a field is a question mark', async ({ page }) => {
    await page.goto('/records');
    await page.getByRole('searchbox').press('?');
    await expect(page.getByRole('searchbox')).toHaveValue('?');
    await expect(page.getByRole('dialog', { name: 'Keys' })).toBeHidden();
  });

  test('g and a key lead to a screen and take the scope along', async ({ page }) => {
    await page.goto('/records?refrigerant=R-22');
    await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
    await page.keyboard.press('g');
    await page.keyboard.press('t');
    await expect(page).toHaveURL(/\/trends\?refrigerant=R-22$/);
  });

  test('single keys can be turned off, and stay off in this browser', async ({ page }) => {
    await page.goto('/glossary');
    await page.getByRole('contentinfo').getByRole('button', { name: 'Keys' }).click();
    const sheet = page.getByRole('dialog', { name: 'Keys' });
    await sheet.getByRole('checkbox').uncheck();
    await page.keyboard.press('Escape');
    await page.reload();
    await page.keyboard.press('?');
    await page.keyboard.press('g');
    await page.keyboard.press('t');
    await expect(sheet).toBeHidden();
    await expect(page).toHaveURL(/\/glossary/);
  });
});

test.describe('the words', () => {
  test.use({ role: 'owner' });

  test('a heading says what its word means, by keyboard and by mouse, and leads to the glossary', async ({ page }) => {
    await page.goto('/records');
    const mark = page.getByRole('button', { name: 'What “full charge” means' });
    const meaning = page.getByRole('dialog', { name: 'Meaning' });
    await mark.focus();
    await page.keyboard.press('Enter');
    await expect(meaning).toContainText('40 CFR 82.152');
    await page.keyboard.press('Escape');
    await expect(meaning).toBeHidden();
    await expect(mark).toBeFocused();

    await mark.hover();
    await expect(meaning).toBeVisible();
    // The mouse may go into what it opened (WCAG 1.4.13, hoverable).
    await meaning.hover();
    await page.waitForTimeout(600);
    await expect(meaning).toBeVisible();
    await meaning.getByRole('link', { name: 'In the glossary' }).click();
    await expect(page).toHaveURL(/\/glossary#full-charge$/);
    await expect(page.locator('#full-charge')).toBeInViewport();
  });

  test('the glossary finds words by their other names', async ({ page }) => {
    await page.goto('/glossary');
    await page.getByLabel('Find a word').fill('bottle');
    await expect(page.getByRole('term')).toHaveCount(1);
    await expect(page.getByRole('term')).toContainText('Recovery cylinder');
  });
});

test.describe('the first page of the day', () => {
  test.use({ role: 'operations' });

  test('each thing that waits leads to as many records as it says', async ({ page }) => {
    await page.goto('/');
    const item = page.getByRole('listitem').filter({ hasText: 'need a look' });
    const count = Number((await item.locator('.marked').textContent())?.replace(/\D/g, ''));
    expect(count).toBeGreaterThan(0);
    await item.getByRole('link').click();
    await expect(page).toHaveURL(/\/flags\?from=/);
    await expect(page.getByRole('heading', { level: 1 })).toContainText(new RegExp(`^${count}\\s`), {
      timeout: 30_000,
    });
  });
});
