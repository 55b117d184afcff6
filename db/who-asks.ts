import 'server-only';
import type { DisplayUnit, Role } from '@/lib/vocabulary';
import { serverPool } from './client';

type MembershipRow = {
  companyId: string;
  companyName: string;
  role: Role;
  technicianId: string | null;
  timeZone: string;
  massUnit: DisplayUnit;
};

type SessionRow = {
  personId: string;
  name: string;
  email: string;
  /** The company the session works in; one of the memberships. */
  companyId: string;
  memberships: MembershipRow[];
  /** Grows with every change that an answer could show (`state_of_records`). */
  revision: number;
};

type AccessTokenRow = { tokenId: string; label: string; membership: MembershipRow; revision: number };

// Every request begins with one of these two: a statement that is its own transaction, and so one round trip.
const SESSION = `select person_id as "personId", name, email, company_id as "companyId", memberships,
  revision::double precision as revision from viewer_of_session($1)`;
const ACCESS_TOKEN = `select token_id as "tokenId", label, membership, revision::double precision as revision
  from viewer_of_access_token($1)`;

const firstRow = async <Row extends object>(statement: string, hash: string): Promise<Row | null> => {
  const { rows } = await serverPool().query<Row>(statement, [hash]);
  return rows[0] ?? null;
};

/** The person of the session with this token hash, his companies and the state of his own one's records; null when it lives no more or he is in no company. */
export const sessionByHash = (hash: string): Promise<SessionRow | null> => firstRow(SESSION, hash);

/** What the access token with this hash opens, and the state of its company's records; null when unknown or revoked. */
export const accessTokenByHash = (hash: string): Promise<AccessTokenRow | null> => firstRow(ACCESS_TOKEN, hash);
