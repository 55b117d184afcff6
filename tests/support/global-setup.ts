import { openThrowAway, type ThrowAway } from '@/db/cluster/throw-away';

let database: ThrowAway | undefined;

/** A throw-away cluster for the run; each suite makes companies of its own in it. */
export const setup = async (): Promise<void> => {
  database = await openThrowAway('unit');
  const { urls, secret } = database;
  process.env.SERVER_DATABASE_URL = urls.server;
  process.env.JOB_DATABASE_URL = urls.job;
  process.env.OWNER_DATABASE_URL = urls.owner;
  process.env.ADMIN_DATABASE_URL = urls.admin;
  process.env.NEXTAUTH_SECRET = secret;
  process.env.NEXTAUTH_URL = 'http://127.0.0.1:3000';
};

export const teardown = (): void => database?.destroy();
