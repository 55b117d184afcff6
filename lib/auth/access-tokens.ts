import 'server-only';
import { and, eq, isNull } from 'drizzle-orm';
import { addSettings, withKnowledge } from '@/db/client';
import { companies } from '@/db/schema/companies';
import { accessTokens } from '@/db/schema/people';
import { hashToken } from './tokens';
import type { Viewer } from './viewer';

/** Who a bearer token is; null when it is unknown or revoked. */
export const viewerOfAccessToken = (token: string): Promise<Viewer | null> =>
  withKnowledge({ token_hash: hashToken(token) }, async (tx) => {
    const [found] = await tx
      .select()
      .from(accessTokens)
      .where(and(eq(accessTokens.tokenHash, hashToken(token)), isNull(accessTokens.revokedAt)));
    if (!found) return null;
    await addSettings(tx, { company_id: found.companyId });
    const [company] = await tx.select().from(companies).where(eq(companies.id, found.companyId));
    if (!company) return null;
    return {
      kind: 'program',
      actor: `token ${found.id}`,
      name: found.label,
      companyId: company.id,
      companyName: company.name,
      role: found.role,
      technicianId: found.technicianId,
      timeZone: company.timeZone,
      massUnit: company.massUnit,
    };
  });
