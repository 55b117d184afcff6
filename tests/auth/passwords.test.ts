import { randomUUID } from 'node:crypto';
import { expect, test } from 'vitest';
import { hashPassword, passwordMatches } from '@/lib/auth/passwords';

// OWASP Password Storage Cheat Sheet, section Argon2id: "a minimum configuration of 19 MiB of memory, an iteration
// count of 2, and 1 degree of parallelism". PHC string format: $argon2id$v=19$m=…,t=…,p=…$salt$hash; v=19 is 0x13,
// the version of RFC 9106.
const PHC = /^\$argon2id\$v=19\$m=(\d+),t=(\d+),p=(\d+)\$([A-Za-z0-9+/]+)\$([A-Za-z0-9+/]+)$/;

test('a password is kept as argon2id with at least the parameters OWASP asks for', async () => {
  const [, memoryKib, passes, lanes, salt = '', hash = ''] = (await hashPassword('correct horse')).match(PHC) ?? [];
  expect(Number(memoryKib)).toBeGreaterThanOrEqual(19 * 1024);
  expect(Number(passes)).toBeGreaterThanOrEqual(2);
  expect(Number(lanes)).toBeGreaterThanOrEqual(1);
  // RFC 9106, section 3.1: 16 bytes of salt are recommended for password hashing; section 4: 32 bytes of tag.
  expect(Buffer.from(salt, 'base64')).toHaveLength(16);
  expect(Buffer.from(hash, 'base64')).toHaveLength(32);
});

test('the same password twice gives two different hashes', async () => {
  expect(await hashPassword('correct horse')).not.toBe(await hashPassword('correct horse'));
});

test('only the right password matches', async () => {
  const password = randomUUID();
  const stored = await hashPassword(password);
  expect(await passwordMatches(stored, password)).toBe(true);
  expect(await passwordMatches(stored, `${password} `)).toBe(false);
  expect(await passwordMatches(stored, '')).toBe(false);
});

test('nobody has the password that stands in for a missing one', async () => {
  expect(await passwordMatches(null, 'nobody has this password')).toBe(false);
  expect(await passwordMatches(undefined, 'nobody has this password')).toBe(false);
});

const leastMs = async (work: () => Promise<unknown>): Promise<number> => {
  const times: number[] = [];
  for (let i = 0; i < 6; i++) {
    const began = performance.now();
    await work();
    times.push(performance.now() - began);
  }
  return Math.min(...times);
};

test('an unknown address costs as much time as a known one', async () => {
  const stored = await hashPassword('correct horse');
  const known = await leastMs(() => passwordMatches(stored, 'wrong'));
  const unknown = await leastMs(() => passwordMatches(null, 'wrong'));
  // A shortcut would take next to nothing; the least of six runs is little disturbed by other work.
  expect(unknown).toBeGreaterThan(known / 3);
});
