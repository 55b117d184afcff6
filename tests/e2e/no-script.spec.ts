import { expect, signInOf, test } from './support';

test.use({ javaScriptEnabled: false });

test('signing in works before, and without, the page’s script', async ({ page }) => {
  const { email, password } = signInOf('operations');
  await page.goto('/sign-in?next=%2Frecords');
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password').fill('wrong');
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page.getByText('do not belong together')).toBeVisible();
  await expect(page.getByLabel('E-mail')).toHaveValue(email);
  await page.getByLabel('Password').fill(password);
  await page.getByLabel('Password').press('Enter');
  await expect(page).toHaveURL(/\/records$/);
});
