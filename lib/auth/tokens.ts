import { createHash, randomBytes } from 'node:crypto';

/** A new unguessable token of 32 random bytes, with a readable prefix that tells what it opens. */
export const newToken = (prefix: 'tb_api' | 'tb_link' | 'tb_session'): string =>
  `${prefix}_${randomBytes(32).toString('base64url')}`;

/** What is stored of a token. A fast hash is enough: the token itself cannot be guessed. */
export const hashToken = (token: string): string => createHash('sha256').update(token).digest('base64url');
