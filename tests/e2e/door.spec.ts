import { findPages } from '../support/discover';
import { postCredentials } from './sign-in';
import { expect, signInOf, test } from './support';

const operations = () => signInOf('operations');

test('the application answers and is healthy', async ({ request }) => {
  const response = await request.get('/api/health');
  expect(response.status()).toBe(200);
  expect(await response.json()).toMatchObject({ status: 'ok', database: 'ok' });
});

test('every page of the application sends the signed-out to the door and remembers the way', async ({ request }) => {
  const pages = findPages('(app)').map((path) => path.replace(/\[\w+\]/g, '00000000-0000-4000-8000-000000000000'));
  expect(pages.length).toBeGreaterThan(0);
  for (const path of ['/', ...pages]) {
    const response = await request.get(`${path}?from=2025-01`, { maxRedirects: 0 });
    expect(response.status(), path).toBe(307);
    expect(response.headers().location, path).toBe(`/sign-in?next=${encodeURIComponent(`${path}?from=2025-01`)}`);
  }
});

test('signing in gives a cookie that scripts cannot read and other sites cannot send along', async ({ request }) => {
  const response = await postCredentials(request, operations());
  expect(response.status()).toBe(200);
  const cookies = response.headersArray().filter(({ name }) => name.toLowerCase() === 'set-cookie');
  const session = cookies.find(({ value }) => value.startsWith('next-auth.session-token='))?.value ?? '';
  expect(session).toMatch(/; HttpOnly/i);
  expect(session).toMatch(/; SameSite=Lax/i);
  expect(session).toMatch(/; Path=\//i);
  expect((await request.get('/api/work')).status()).toBe(200);
});

test('nobody signs in without the anti-forgery token', async ({ request }) => {
  await request.get('/api/auth/csrf');
  const { email, password } = operations();
  await request.post('/api/auth/callback/credentials', { form: { csrfToken: 'made up', email, password } });
  expect((await request.get('/api/work')).status()).toBe(401);
});

test('a wrong password and an unknown address get the same refusal', async ({ request }) => {
  const wrong = await postCredentials(request, { ...operations(), password: 'wrong' });
  const unknown = await postCredentials(request, { email: 'nobody@example.test', password: 'wrong' });
  expect(wrong.status()).toBe(401);
  expect(unknown.status()).toBe(401);
  expect(await unknown.text()).toBe(await wrong.text());
});

test('too many wrong tries are told how long to wait', async ({ request }) => {
  const guess = () => postCredentials(request, { email: 'guessed@example.test', password: 'wrong' });
  for (let i = 0; i < 8; i++) expect((await (await guess()).json()).url).toMatch(/error=CredentialsSignin/);
  expect(decodeURIComponent((await (await guess()).json()).url)).toMatch(/error=wait:\d+/);
});

test('a copied cookie is worth nothing after sign-out', async ({ request, playwright, baseURL }) => {
  await postCredentials(request, operations());
  const thief = await playwright.request.newContext({
    ...(baseURL ? { baseURL } : {}),
    storageState: await request.storageState(),
  });
  expect((await thief.get('/api/work')).status()).toBe(200);
  const { csrfToken } = await (await request.get('/api/auth/csrf')).json();
  await request.post('/api/auth/signout', { form: { csrfToken, json: 'true' } });
  expect((await thief.get('/api/work')).status()).toBe(401);
  await thief.dispose();
});

test('a write with the cookie from another site is refused', async ({ request }) => {
  await postCredentials(request, operations());
  const response = await request.post('/api/imports', { headers: { origin: 'https://elsewhere.example' } });
  expect(response.status()).toBe(403);
});

test('pages come with a content policy that runs no foreign and no inline script', async ({ request }) => {
  const headers = (await request.get('/sign-in')).headers();
  const scripts = headers['content-security-policy']?.match(/script-src ([^;]+)/)?.[1] ?? '';
  expect(scripts).toMatch(/'nonce-[\w+/=]+'/);
  expect(scripts).not.toMatch(/unsafe-inline|unsafe-eval|\*|https?:/);
  expect(headers).toMatchObject({ 'x-content-type-options': 'nosniff', 'x-frame-options': 'DENY' });
});

test('what the form says on a wrong password loses nothing typed', async ({ page }) => {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(operations().email);
  await page.getByLabel('Password', { exact: true }).fill('wrong');
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page.getByRole('alert').filter({ hasText: /password/i })).toBeVisible();
  await expect(page.getByLabel('E-mail')).toHaveValue(operations().email);
});

test('the form leads to where one wanted to go, and signing out leads back to the door', async ({ page }) => {
  await page.goto('/trends?from=2025-01');
  await expect(page).toHaveURL(/\/sign-in\?next=/);
  await page.getByLabel('E-mail').fill(operations().email);
  await page.getByLabel('Password', { exact: true }).fill(operations().password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page).toHaveURL(/\/trends\?from=2025-01/);
  const session = (await page.context().cookies()).find(({ name }) => name === 'next-auth.session-token');
  expect(session).toMatchObject({ httpOnly: true, sameSite: 'Lax', path: '/' });
  await page.getByRole('button', { name: /Desmond Achterberg/ }).click();
  await page.getByRole('button', { name: 'Sign out' }).click();
  await expect(page).toHaveURL(/\/sign-in/);
  await page.goto('/trends');
  await expect(page).toHaveURL(/\/sign-in/);
});
