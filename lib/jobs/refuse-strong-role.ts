import 'server-only';
import { serverPool } from '@/db/client';
import { log } from '@/lib/log';
import { isConnectionLoss } from './connection-loss';

const STRENGTH = `
  select rolname as role, rolsuper or rolbypassrls as strong,
         exists (select from pg_class where relowner = pg_roles.oid and relkind in ('r', 'p', 'v', 'm')) as owns
  from pg_roles where rolname = current_user`;

/**
 * Row-level security keeps companies apart only under a role that cannot pass it by. Throws, so that the server does
 * not start, when the role of SERVER_DATABASE_URL is a superuser, has BYPASSRLS or owns a table or view.
 */
export const refuseStrongRole = async (): Promise<void> => {
  try {
    const { rows } = await serverPool().query<{ role: string; strong: boolean; owns: boolean }>(STRENGTH);
    const [found] = rows;
    if (!found || found.strong || found.owns)
      throw new Error(`The role ${found?.role} could pass by row-level security; serve requests with one that cannot.`);
  } catch (error) {
    // A database that is away for a moment says nothing about roles: /api/health tells that it is away.
    if (!isConnectionLoss(error)) throw error;
    log.warn({ err: error }, 'the database is out of reach');
  }
};
