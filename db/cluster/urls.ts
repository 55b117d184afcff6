import { createHmac } from 'node:crypto';

/** Login roles apart: the owner migrates, the server serves, the job role works the queue. Only the first owns tables. */
export const DATABASE_ROLES = { owner: 'tarebook_owner', server: 'tarebook_server', job: 'tarebook_job' } as const;
export type DatabaseRole = keyof typeof DATABASE_ROLES;

/** Addresses of one database, by who connects. `admin` makes roles and databases and is used for nothing else. */
export type DatabaseUrls = Record<DatabaseRole | 'admin', string>;

/** The password of a role follows from the secret, so that several servers with one secret agree without a word. */
export const rolePassword = (secret: string, role: DatabaseRole | 'admin'): string =>
  createHmac('sha256', secret).update(`database role ${role}`).digest('base64url');

/** Gives the four addresses of the database that `adminUrl` points at; throws on an address that cannot be parsed. */
export const databaseUrls = (adminUrl: string, secret: string): DatabaseUrls => {
  const as = (role: DatabaseRole) => {
    const url = new URL(adminUrl);
    url.username = DATABASE_ROLES[role];
    url.password = rolePassword(secret, role);
    return url.toString();
  };
  return { admin: adminUrl, owner: as('owner'), server: as('server'), job: as('job') };
};
