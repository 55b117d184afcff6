import { sql } from 'drizzle-orm';
import {
  bigint,
  foreignKey,
  index,
  integer,
  pgPolicy,
  pgTable,
  primaryKey,
  text,
  timestamp,
  uniqueIndex,
  uuid,
} from 'drizzle-orm/pg-core';
import { ROLES } from '@/lib/vocabulary';
import { companyId, companyPolicy, createdAt, setting } from './columns';
import { companies } from './companies';
import { technicians } from './places';

const ownPerson = sql`person_id = ${setting('person_id')}::uuid`;
const instant = (name: string) => timestamp(name, { withTimezone: true, mode: 'string' });

/** Somebody who can sign in. People stand above companies: one may belong to several. */
export const people = pgTable(
  'people',
  {
    id: uuid('id').primaryKey().defaultRandom(),
    email: text('email').notNull(),
    name: text('name').notNull(),
    /** argon2id in PHC format; NULL until the password link was used. */
    passwordHash: text('password_hash'),
    createdAt: createdAt(),
  },
  (t) => [
    uniqueIndex('people_email').on(sql`lower(${t.email})`),
    pgPolicy('oneself', {
      for: 'all',
      using: sql`id = ${setting('person_id')}::uuid`,
      withCheck: sql`id = ${setting('person_id')}::uuid`,
    }),
    pgPolicy('by_email', { for: 'select', using: sql`lower(email) = lower(${setting('sign_in_email')})` }),
    pgPolicy('of_company', {
      for: 'select',
      using: sql`id in (select m.person_id from memberships m where m.company_id = ${setting('company_id')}::uuid)`,
    }),
  ],
);

/** Which person plays which role in which company. */
export const memberships = pgTable(
  'memberships',
  {
    companyId: companyId().references(() => companies.id, { onDelete: 'cascade' }),
    personId: uuid('person_id')
      .notNull()
      .references(() => people.id, { onDelete: 'cascade' }),
    role: text('role', { enum: ROLES }).notNull(),
    /** The technician this person is; a technician sees only his own records. */
    technicianId: uuid('technician_id'),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.personId] }),
    foreignKey({ columns: [t.companyId, t.technicianId], foreignColumns: [technicians.companyId, technicians.id] }),
    index('memberships_person').on(t.personId),
    companyPolicy(),
    pgPolicy('own_membership', { for: 'select', using: ownPerson }),
  ],
);

/** Signed-in browsers. The cookie carries the token, the table its hash: a deleted row is a closed door. */
export const sessions = pgTable(
  'sessions',
  {
    tokenHash: text('token_hash').primaryKey(),
    personId: uuid('person_id')
      .notNull()
      .references(() => people.id, { onDelete: 'cascade' }),
    /** The company this session works in; a person in two switches by changing it. */
    companyId: uuid('company_id').references(() => companies.id, { onDelete: 'set null' }),
    createdAt: createdAt(),
    expiresAt: instant('expires_at').notNull(),
    userAgent: text('user_agent'),
  },
  (t) => [
    index('sessions_person').on(t.personId),
    pgPolicy('own_session', { for: 'all', using: ownPerson, withCheck: ownPerson }),
    pgPolicy('by_token', { for: 'select', using: sql`token_hash = ${setting('session_hash')}` }),
  ],
);

/** One-time links with which a person sets a password. */
export const passwordLinks = pgTable(
  'password_links',
  {
    tokenHash: text('token_hash').primaryKey(),
    personId: uuid('person_id')
      .notNull()
      .references(() => people.id, { onDelete: 'cascade' }),
    createdAt: createdAt(),
    expiresAt: instant('expires_at').notNull(),
    usedAt: instant('used_at'),
  },
  (t) => [
    index('password_links_person').on(t.personId),
    pgPolicy('own_link', { for: 'all', using: ownPerson, withCheck: ownPerson }),
    pgPolicy('by_token', { for: 'select', using: sql`token_hash = ${setting('link_hash')}` }),
  ],
);

/** Bearer tokens of programs: one company, one role, shown once, stored hashed. */
export const accessTokens = pgTable(
  'access_tokens',
  {
    companyId: companyId().references(() => companies.id, { onDelete: 'cascade' }),
    id: uuid('id').notNull().defaultRandom(),
    tokenHash: text('token_hash').notNull(),
    label: text('label').notNull(),
    role: text('role', { enum: ROLES }).notNull(),
    technicianId: uuid('technician_id'),
    createdBy: uuid('created_by'),
    createdAt: createdAt(),
    revokedAt: instant('revoked_at'),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    uniqueIndex('access_tokens_hash').on(t.tokenHash),
    foreignKey({ columns: [t.companyId, t.technicianId], foreignColumns: [technicians.companyId, technicians.id] }),
    companyPolicy(),
    pgPolicy('by_token', { for: 'select', using: sql`token_hash = ${setting('token_hash')}` }),
  ],
);

/** Counters of tries, kept by rate-limiter-flexible; its column names are the library's. */
export const rateLimits = pgTable('rate_limits', {
  key: text('key').primaryKey(),
  points: integer('points').notNull().default(0),
  expire: bigint('expire', { mode: 'number' }),
});
