import 'server-only';
import { hash, verify } from '@node-rs/argon2';

// OWASP Password Storage Cheat Sheet, argon2id minimum: 19 MiB, 2 passes, 1 lane. Algorithm 2 is argon2id.
const ARGON2ID = { algorithm: 2, memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const;

export const LEAST_PASSWORD_LENGTH = 12;

export const hashPassword = (password: string): Promise<string> => hash(password, ARGON2ID);

let nobody: Promise<string> | undefined;

/** Whether the password is right. Without a stored hash it takes the same time and says no. */
export const passwordMatches = async (stored: string | null | undefined, password: string): Promise<boolean> => {
  nobody ??= hashPassword('nobody has this password');
  const matches = await verify(stored ?? (await nobody), password);
  return Boolean(stored) && matches;
};
