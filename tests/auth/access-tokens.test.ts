import { eq, sql } from 'drizzle-orm';
import { expect, test } from 'vitest';
import { GET as getWork } from '@/app/api/work/route';
import { withCompany } from '@/db/client';
import { accessTokens } from '@/db/schema/people';
import { viewerOfAccessToken } from '@/lib/auth/access-tokens';
import { hashToken } from '@/lib/auth/tokens';
import { apiRequest, newCompany } from '../support/company';

const statusWith = async (token: string): Promise<number> => (await getWork(apiRequest('/api/work', token), {})).status;

test('a token is one company and one role', async () => {
  const { companyId, token } = await newCompany();
  const secret = await token('auditor');
  expect(await statusWith(secret)).toBe(200);
  expect(await viewerOfAccessToken(secret)).toMatchObject({ kind: 'program', companyId, role: 'auditor' });
});

test('a revoked token opens nothing', async () => {
  const { scope, token } = await newCompany();
  const secret = await token('owner');
  await withCompany(scope, (tx) =>
    tx
      .update(accessTokens)
      .set({ revokedAt: sql`now()` })
      .where(eq(accessTokens.tokenHash, hashToken(secret))),
  );
  expect(await statusWith(secret)).toBe(401);
});

test('the token itself is not kept', async () => {
  const { scope, token } = await newCompany();
  const secret = await token('owner');
  const kept = await withCompany(scope, (tx) => tx.select().from(accessTokens));
  expect(kept).toHaveLength(1);
  expect(JSON.stringify(kept)).not.toContain(secret);
});

test('a refusal is problem+json with the scheme to use, and says nothing of the token', async () => {
  const response = await getWork(apiRequest('/api/work', 'tb_api_made-up'), {});
  expect(response.status).toBe(401);
  expect(response.headers.get('content-type')).toBe('application/problem+json');
  // RFC 9110, section 11.6.1: a 401 carries WWW-Authenticate.
  expect(response.headers.get('www-authenticate')).toBe('Bearer');
  expect(await response.text()).not.toContain('made-up');
});
