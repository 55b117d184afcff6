import { randomUUID } from 'node:crypto';
import { expect, test } from 'vitest';
import { authOptions } from '@/lib/auth/options';
import { newCompany } from '../support/company';
import { newPerson } from '../support/session';

type Authorize = (
  credentials: { email: string; password: string },
  request: { headers: Record<string, string> },
) => Promise<{ id: string; sessionToken: string } | null>;

// next-auth keeps what was configured under `options`, typed as anything a provider may take.
const [configured] = authOptions().providers.map((provider) => provider.options as { authorize: Authorize });
if (!configured) throw new Error('There is no way to sign in.');
const { authorize } = configured;

/** An address of the range for documentation, RFC 5737, of this test's own. */
let last = 0;
const newAddress = () => `203.0.113.${++last}`;

const attempt = (email: string, password: string, address: string) =>
  authorize({ email, password }, { headers: { 'x-forwarded-for': address } });

test('the right password opens a session, letters of the address small or large', async () => {
  const { companyId } = await newCompany();
  const { personId, email, password } = await newPerson(companyId, 'owner');
  const signedIn = await attempt(email.toUpperCase(), password, newAddress());
  expect(signedIn).toMatchObject({ id: personId, sessionToken: expect.stringMatching(/^tb_session_[\w-]{43}$/) });
});

test('a wrong password and an unknown address get the same answer', async () => {
  const { companyId } = await newCompany();
  const { email } = await newPerson(companyId, 'owner');
  expect(await attempt(email, 'wrong', newAddress())).toBeNull();
  expect(await attempt(`${randomUUID()}@example.test`, 'wrong', newAddress())).toBeNull();
});

test('an account is closed for a while after eight wrong tries, also to the right password from elsewhere', async () => {
  const { companyId } = await newCompany();
  const { email, password } = await newPerson(companyId, 'owner');
  for (let i = 0; i < 8; i++) expect(await attempt(email, 'wrong', newAddress())).toBeNull();
  const refused = await attempt(email, password, newAddress()).catch((error: Error) => error.message);
  const [, seconds] = String(refused).match(/^wait:(\d+)$/) ?? [];
  expect(Number(seconds)).toBeGreaterThan(0);
  expect(Number(seconds)).toBeLessThanOrEqual(15 * 60);
});

test('an address that is not known is closed in the same way', async () => {
  const email = `${randomUUID()}@example.test`;
  for (let i = 0; i < 8; i++) expect(await attempt(email, 'wrong', newAddress())).toBeNull();
  await expect(attempt(email, 'wrong', newAddress())).rejects.toThrow(/^wait:\d+$/);
});

test('the right password in time clears the count', async () => {
  const { companyId } = await newCompany();
  const { email, password } = await newPerson(companyId, 'owner');
  for (let round = 0; round < 2; round++) {
    for (let i = 0; i < 7; i++) expect(await attempt(email, 'wrong', newAddress())).toBeNull();
    expect(await attempt(email, password, newAddress())).not.toBeNull();
  }
});

test('one guesser against many accounts is stopped, whatever he writes before his address', async () => {
  const address = newAddress();
  const guess = () => attempt(`${randomUUID()}@example.test`, 'wrong', `${randomUUID()}, ${address}`);
  for (let i = 0; i < 50; i++) expect(await guess()).toBeNull();
  await expect(guess()).rejects.toThrow(/^wait:\d+$/);
});

test('many people of one office may sign in from one address', async () => {
  const address = newAddress();
  const { companyId } = await newCompany();
  const { email, password } = await newPerson(companyId, 'owner');
  for (let i = 0; i < 55; i++) expect(await attempt(email, password, address)).not.toBeNull();
});
