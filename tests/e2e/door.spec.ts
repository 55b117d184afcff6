import { expect, test } from '@playwright/test';

test('the application answers and is healthy', async ({ request }) => {
  const response = await request.get('/api/health');
  expect(response.status()).toBe(200);
  expect(await response.json()).toMatchObject({ status: 'ok', database: 'ok' });
});
