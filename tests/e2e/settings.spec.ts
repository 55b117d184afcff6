import { randomUUID } from 'node:crypto';
import { expect, test } from './support';

test.use({ role: 'owner' });

test('a refusal keeps what was typed and chosen, and the choice that is shown is the one that is sent', async ({
  page,
  faults,
}) => {
  const email = `${randomUUID()}@settings.example`;
  await page.goto('/settings');
  await page.getByRole('button', { name: 'Add a person' }).click();
  const form = page.getByRole('dialog', { name: 'Add a person' });
  await form.getByLabel('Name').fill('Ruth Ashdown');
  await form.getByLabel('E-mail').fill('no address');
  await form.getByLabel('Role').selectOption('auditor');
  await form.getByRole('button', { name: 'Add and make a link' }).click();
  await expect(form.getByRole('alert')).toHaveText(/Write an e-mail address/);
  await expect(form.getByLabel('Name')).toHaveValue('Ruth Ashdown');
  await expect(form.getByLabel('Role')).toHaveValue('auditor');
  await form.getByLabel('E-mail').fill(email);
  await form.getByRole('button', { name: 'Add and make a link' }).click();
  await expect(form.getByLabel('To hand over')).toHaveValue(/\/set-password\/tb_link_/);
  await form.getByRole('button', { name: 'Done' }).click();
  await expect(page.getByRole('row', { name: email })).toContainText('Auditor');
  expect(faults).toEqual([]);
});

test('a token opens the interface until it is revoked', async ({ page, request, faults }) => {
  const label = `Export ${randomUUID()}`;
  await page.goto('/settings');
  await page.getByLabel('What it is for').fill(label);
  await page.getByRole('button', { name: 'Make a token' }).click();
  const token = await page.getByLabel('To hand over').inputValue();
  const ask = () => request.get('/api/scope-options', { headers: { authorization: `Bearer ${token}` } });
  expect((await ask()).status()).toBe(200);
  await page.getByRole('button', { name: `Revoke ${label}`, exact: true }).click();
  await page.getByRole('button', { name: `Yes, revoke ${label}` }).click();
  await expect(page.getByRole('row', { name: label })).toHaveCount(0);
  expect((await ask()).status()).toBe(401);
  expect(faults).toEqual([]);
});
