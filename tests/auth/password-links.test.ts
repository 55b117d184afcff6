import { eq, sql } from 'drizzle-orm';
import { expect, test } from 'vitest';
import { withKnowledge, withPerson } from '@/db/client';
import { passwordLinks, people } from '@/db/schema/people';
import { personOfLink, setPasswordByLink } from '@/lib/auth/password-links';
import { passwordMatches } from '@/lib/auth/passwords';
import { createPasswordLink } from '@/lib/auth/provision';
import { hashToken } from '@/lib/auth/tokens';
import { newCompany } from '../support/company';
import { newPerson } from '../support/session';

const NEW_PASSWORD = 'a new long password';

const newLink = async () => {
  const { companyId } = await newCompany();
  const person = await newPerson(companyId, 'office');
  return { companyId, ...person, link: await createPasswordLink(companyId, person.personId) };
};

const storedHash = async (email: string) => {
  const [person] = await withKnowledge({ sign_in_email: email }, (tx) =>
    tx.select({ passwordHash: people.passwordHash }).from(people).where(eq(people.email, email)),
  );
  return person?.passwordHash;
};

test('a link tells whose password it sets and sets it', async () => {
  const { link, email, password } = await newLink();
  expect(await personOfLink(link)).toMatchObject({ email });
  expect(await setPasswordByLink(link, NEW_PASSWORD)).toBe(true);
  expect(await passwordMatches(await storedHash(email), NEW_PASSWORD)).toBe(true);
  expect(await passwordMatches(await storedHash(email), password)).toBe(false);
});

test('a link works once', async () => {
  const { link, email } = await newLink();
  expect(await setPasswordByLink(link, NEW_PASSWORD)).toBe(true);
  expect(await personOfLink(link)).toBeNull();
  expect(await setPasswordByLink(link, 'the thief’s long password')).toBe(false);
  expect(await passwordMatches(await storedHash(email), NEW_PASSWORD)).toBe(true);
});

test('of two uses at the same moment one wins', async () => {
  const { link } = await newLink();
  const outcomes = await Promise.all([setPasswordByLink(link, NEW_PASSWORD), setPasswordByLink(link, NEW_PASSWORD)]);
  expect(outcomes.sort()).toEqual([false, true]);
});

test('a link expires, within seven days', async () => {
  const { link, personId } = await newLink();
  const ofLink = eq(passwordLinks.tokenHash, hashToken(link));
  const [kept] = await withPerson(personId, (tx) => tx.select().from(passwordLinks).where(ofLink));
  expect(Date.parse(kept?.expiresAt ?? '')).toBeLessThanOrEqual(Date.now() + 7 * 24 * 60 * 60 * 1000);
  await withPerson(personId, (tx) =>
    tx.update(passwordLinks).set({ expiresAt: sql`now() - interval '1 second'` }).where(ofLink),
  );
  expect(await personOfLink(link)).toBeNull();
  expect(await setPasswordByLink(link, NEW_PASSWORD)).toBe(false);
});

test('a link that was never given opens nothing', async () => {
  expect(await personOfLink(`tb_link_${'A'.repeat(43)}`)).toBeNull();
  expect(await setPasswordByLink('', NEW_PASSWORD)).toBe(false);
});
