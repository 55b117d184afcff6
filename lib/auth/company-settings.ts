import 'server-only';
import { and, desc, eq, isNull, sql } from 'drizzle-orm';
import { type CompanyScope, withCompany } from '@/db/client';
import { companies } from '@/db/schema/companies';
import { accessTokens } from '@/db/schema/people';
import { badInput, notFound } from '@/lib/errors';
import type { DisplayUnit, Role } from '@/lib/vocabulary';

/** Whether this is an IANA time zone that the dates of records can be reckoned in. */
export const isTimeZone = (name: string): boolean => {
  try {
    return Boolean(new Intl.DateTimeFormat('en', { timeZone: name }).resolvedOptions().timeZone) && !/^[+-]/.test(name);
  } catch {
    return false;
  }
};

/** Names the company and says in which zone its days begin and which unit its people read; throws on an unknown zone. */
export const updateCompany = async (
  scope: CompanyScope,
  company: { name: string; timeZone: string; massUnit: DisplayUnit },
): Promise<void> => {
  if (!isTimeZone(company.timeZone))
    throw badInput([{ path: 'timeZone', message: 'Choose a zone from the list, for example America/New_York.' }]);
  await withCompany(scope, (tx) => tx.update(companies).set(company).where(eq(companies.id, scope.companyId)));
};

/** A token as it is listed: never the token itself. */
export type TokenSummary = { id: string; label: string; role: Role; createdAt: string };

/** Tokens that still open something, the newest first. */
export const listAccessTokens = (scope: CompanyScope): Promise<TokenSummary[]> =>
  withCompany(scope, (tx) =>
    tx
      .select({
        id: accessTokens.id,
        label: accessTokens.label,
        role: accessTokens.role,
        createdAt: accessTokens.createdAt,
      })
      .from(accessTokens)
      .where(isNull(accessTokens.revokedAt))
      .orderBy(desc(accessTokens.createdAt)),
  );

/** Closes a token for good; throws when it is not there. */
export const revokeAccessToken = (scope: CompanyScope, id: string): Promise<void> =>
  withCompany(scope, async (tx) => {
    const revoked = await tx
      .update(accessTokens)
      .set({ revokedAt: sql`now()` })
      .where(and(eq(accessTokens.companyId, scope.companyId), eq(accessTokens.id, id), isNull(accessTokens.revokedAt)))
      .returning({ id: accessTokens.id });
    if (!revoked.length) throw notFound('This token');
  });
