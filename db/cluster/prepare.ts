import { fileURLToPath } from 'node:url';
import { drizzle } from 'drizzle-orm/node-postgres';
import { migrate } from 'drizzle-orm/node-postgres/migrator';
import { writeRefrigerantCatalogue } from '@/db/catalogue/write';
import { prepareQueue } from './queue';
import { grantTables, prepareRoles, withConnection } from './roles';
import type { DatabaseUrls } from './urls';

const MIGRATIONS = fileURLToPath(new URL('../migrations', import.meta.url));

/**
 * Brings a database to the state the code expects: roles, migrations, grants, queue, refrigerant catalogue.
 * Idempotent; throws the database's own error with its cause.
 */
export const prepareDatabase = async (urls: DatabaseUrls, secret: string): Promise<void> => {
  await prepareRoles(urls, secret);
  await withConnection(urls.owner, (owner) => migrate(drizzle(owner), { migrationsFolder: MIGRATIONS }));
  await grantTables(urls);
  await prepareQueue(urls);
  await withConnection(urls.owner, (owner) => writeRefrigerantCatalogue(drizzle(owner)));
};
