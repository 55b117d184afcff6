import 'server-only';
import { randomUUID } from 'node:crypto';
import { eq, sql } from 'drizzle-orm';
import { addSettings, withCompany, withKnowledge } from '@/db/client';
import { companies } from '@/db/schema/companies';
import { accessTokens, memberships, passwordLinks, people } from '@/db/schema/people';
import type { DisplayUnit, Role } from '@/lib/vocabulary';
import { hashToken, newToken } from './tokens';

const SYSTEM = 'command line';
const LINK_DAYS = 7;

/** Makes an empty company; gives its id. */
export const createCompany = async (
  name: string,
  options: { timeZone?: string; massUnit?: DisplayUnit } = {},
): Promise<string> => {
  const companyId = randomUUID();
  await withCompany({ companyId, actor: SYSTEM }, (tx) =>
    tx.insert(companies).values({ id: companyId, name, ...options }),
  );
  return companyId;
};

/** Ids of the companies of this very name. */
export const companiesNamed = async (name: string): Promise<string[]> => {
  const found = await withKnowledge({ company_name: name }, (tx) =>
    tx.select({ id: companies.id }).from(companies).where(eq(companies.name, name)),
  );
  return found.map(({ id }) => id);
};

/** The person with this address, made if there is none, as a member of the company in a role. Gives the person's id. */
export const addMember = async (
  companyId: string,
  member: { email: string; name: string; role: Role; technicianId?: string | null; passwordHash?: string },
): Promise<string> => {
  const [known] = await withKnowledge({ sign_in_email: member.email }, (tx) =>
    tx
      .select({ id: people.id })
      .from(people)
      .where(eq(sql`lower(${people.email})`, member.email.toLowerCase())),
  );
  const personId = known?.id ?? randomUUID();
  await withCompany({ companyId, actor: SYSTEM }, async (tx) => {
    await addSettings(tx, { person_id: personId });
    if (!known) {
      const { email, name, passwordHash = null } = member;
      await tx.insert(people).values({ id: personId, email, name, passwordHash });
    }
    const { role, technicianId = null } = member;
    await tx
      .insert(memberships)
      .values({ companyId, personId, role, technicianId })
      .onConflictDoUpdate({ target: [memberships.companyId, memberships.personId], set: { role, technicianId } });
  });
  return personId;
};

/** A one-time link token with which the person sets a password. */
export const createPasswordLink = async (companyId: string, personId: string): Promise<string> => {
  const token = newToken('tb_link');
  await withCompany({ companyId, actor: SYSTEM }, async (tx) => {
    await addSettings(tx, { person_id: personId });
    await tx.insert(passwordLinks).values({
      tokenHash: hashToken(token),
      personId,
      expiresAt: sql`now() + make_interval(days => ${LINK_DAYS})`,
    });
  });
  return token;
};

/** A bearer token for one company and role; shown once, stored hashed. */
export const createAccessToken = async (
  companyId: string,
  token: { role: Role; label: string; technicianId?: string | null; createdBy?: string },
): Promise<string> => {
  const secret = newToken('tb_api');
  await withCompany({ companyId, actor: token.createdBy ?? SYSTEM }, (tx) =>
    tx.insert(accessTokens).values({
      companyId,
      tokenHash: hashToken(secret),
      label: token.label,
      role: token.role,
      technicianId: token.technicianId ?? null,
      createdBy: token.createdBy ?? null,
    }),
  );
  return secret;
};
