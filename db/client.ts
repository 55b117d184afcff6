import 'server-only';
import { sql } from 'drizzle-orm';
import { drizzle, type NodePgDatabase } from 'drizzle-orm/node-postgres';
import type { PgTransactionConfig } from 'drizzle-orm/pg-core';
import pg from 'pg';
import { env } from '@/lib/env';
import { companies } from './schema/companies';

/** A transaction that already knows whose rows it may see. Only the doors below make one. */
export type Tx = Parameters<Parameters<NodePgDatabase['transaction']>[0]>[0];

/** Whose data, and in whose name. `technicianId` narrows to one technician's records. */
export type CompanyScope = { companyId: string; technicianId?: string | null; actor: string; reason?: string };

type Settings = Partial<
  Record<
    | 'company_id'
    | 'person_id'
    | 'technician_id'
    | 'actor'
    | 'reason'
    | 'sign_in_email'
    | 'session_hash'
    | 'token_hash'
    | 'link_hash'
    | 'company_name'
    | 'upkeep',
    string
  >
>;

// One pool a process, also when the development server reloads modules.
const kept = globalThis as typeof globalThis & { tarebookPools?: { server?: pg.Pool; job?: pg.Pool } };
kept.tarebookPools ??= {};

const makePool = (connectionString: string, max: number) => {
  const pool = new pg.Pool({ connectionString, max });
  // A connection that dies while idle (server restart) is replaced; without a listener it would end the process.
  pool.on('error', () => undefined);
  // The same for one that dies while somebody works on it: his query fails, and that is where it is dealt with.
  pool.on('connect', (client) => client.on('error', () => undefined));
  return pool;
};

/** Connections of the role that serves requests. */
export const serverPool = (): pg.Pool => {
  const pools = kept.tarebookPools ?? {};
  pools.server ??= makePool(env().SERVER_DATABASE_URL, 12);
  return pools.server;
};

/** Connections of the role that works the queue. */
export const jobPool = (): pg.Pool => {
  const pools = kept.tarebookPools ?? {};
  pools.job ??= makePool(env().JOB_DATABASE_URL, 10);
  return pools.job;
};

const withSettings = <T>(
  settings: Settings,
  work: (tx: Tx) => Promise<T>,
  pool = serverPool(),
  config?: PgTransactionConfig,
): Promise<T> =>
  drizzle(pool).transaction(async (tx) => {
    const all = Object.entries(settings).map(([key, value]) => sql`set_config(${`app.${key}`}, ${value}, true)`);
    await tx.execute(sql`select ${sql.join(all, sql`, `)}`);
    return work(tx);
  }, config);

const companySettings = ({ companyId, technicianId, actor, reason }: CompanyScope): Settings => ({
  company_id: companyId,
  actor,
  ...(technicianId ? { technician_id: technicianId } : {}),
  ...(reason ? { reason } : {}),
});

/** The only door to a company's rows: row-level security shows this transaction that company and no other. */
export const withCompany = <T>(scope: CompanyScope, work: (tx: Tx) => Promise<T>): Promise<T> =>
  withSettings(companySettings(scope), work);

/**
 * The same door for figures that must agree with each other: all queries of `work` see the company as it stood at one
 * moment, whatever an import is doing meanwhile. Read only.
 */
export const readCompany = <T>(scope: CompanyScope, work: (tx: Tx) => Promise<T>): Promise<T> =>
  withSettings(companySettings(scope), work, serverPool(), {
    isolationLevel: 'repeatable read',
    accessMode: 'read only',
  });

/** The same door for background work, under the job role's longer time limits. */
export const withCompanyJob = <T>(scope: CompanyScope, work: (tx: Tx) => Promise<T>): Promise<T> =>
  withSettings(companySettings(scope), work, jobPool());

/** The door for background work that reads: all queries see the company as it stood at one moment. */
export const readCompanyJob = <T>(scope: CompanyScope, work: (tx: Tx) => Promise<T>): Promise<T> =>
  withSettings(companySettings(scope), work, jobPool(), { isolationLevel: 'repeatable read', accessMode: 'read only' });

/** The companies there are, for background work that looks after each of them. The job role alone may ask. */
export const companyIds = (): Promise<string[]> =>
  withSettings(
    { upkeep: 'companies' },
    async (tx) => (await tx.select({ id: companies.id }).from(companies)).map(({ id }) => id),
    jobPool(),
  );

/** A person's own rows: sessions, memberships, password. */
export const withPerson = <T>(personId: string, work: (tx: Tx) => Promise<T>): Promise<T> =>
  withSettings({ person_id: personId, actor: personId }, work);

/** What somebody may see who knows one thing: an address to sign in, or an unguessable token by its hash. */
export const withKnowledge = <T>(
  known:
    | { sign_in_email: string }
    | { session_hash: string }
    | { token_hash: string }
    | { link_hash: string }
    | { company_name: string },
  work: (tx: Tx) => Promise<T>,
): Promise<T> => withSettings(known, work);

/** Sets further scope inside an open transaction, for example the person once the token has told who it is. */
export const addSettings = async (tx: Tx, settings: Settings): Promise<void> => {
  for (const [key, value] of Object.entries(settings))
    await tx.execute(sql`select set_config(${`app.${key}`}, ${value}, true)`);
};
