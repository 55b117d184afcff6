import { randomUUID } from 'node:crypto';
import { expect, test } from 'vitest';
import { withCompany } from '@/db/client';
import { viewerOfAccessToken } from '@/lib/auth/access-tokens';
import { listAccessTokens, revokeAccessToken, updateCompany } from '@/lib/auth/company-settings';
import {
  changeRole,
  inviteMember,
  listLinkableTechnicians,
  listMembers,
  removeMember,
  requireOnlyHere,
} from '@/lib/auth/members';
import { addMember } from '@/lib/auth/provision';
import { openSession, viewerOfSession } from '@/lib/auth/sessions';
import { newCompany } from '../support/company';
import { newPlaces } from '../support/records';

const address = () => `${randomUUID()}@people.test`;

const companyWithOwner = async () => {
  const company = await newCompany();
  const ownerId = await addMember(company.companyId, { email: address(), name: 'Olga Reyes', role: 'owner' });
  return { ...company, ownerId };
};

test('an invited person stands in the list without a password', async () => {
  const { scope } = await companyWithOwner();
  const email = address();
  await inviteMember(scope, { email, name: 'Tom Weller', role: 'office', technicianId: null });
  const added = (await listMembers(scope)).find((member) => member.email === email);
  expect(added).toMatchObject({ name: 'Tom Weller', role: 'office', hasPassword: false });
});

test('an address that signs in anywhere is not taken over', async () => {
  const { scope } = await companyWithOwner();
  const elsewhere = await newCompany();
  const email = address();
  await addMember(elsewhere.companyId, { email, name: 'Ines Falk', role: 'owner' });
  await expect(
    inviteMember(scope, { email: email.toUpperCase(), name: 'Ines', role: 'auditor', technicianId: null }),
  ).rejects.toMatchObject({ status: 400, errors: [{ path: 'email' }] });
  expect(await listMembers(scope)).toHaveLength(1);
});

test('a new role holds at the next request of an open session', async () => {
  const { scope, companyId } = await companyWithOwner();
  const personId = await addMember(companyId, { email: address(), name: 'Pia Lund', role: 'trainer' });
  const session = await openSession(personId, null);
  await changeRole(scope, personId, 'auditor', null);
  expect((await viewerOfSession(session))?.role).toBe('auditor');
});

test('a removed person’s open session opens nothing', async () => {
  const { scope, companyId } = await companyWithOwner();
  const personId = await addMember(companyId, { email: address(), name: 'Pia Lund', role: 'trainer' });
  const session = await openSession(personId, null);
  await removeMember(scope, personId);
  expect(await viewerOfSession(session)).toBeNull();
});

test('the last owner stays owner', async () => {
  const { scope, ownerId } = await companyWithOwner();
  await expect(removeMember(scope, ownerId)).rejects.toMatchObject({ status: 409 });
  await expect(changeRole(scope, ownerId, 'office', null)).rejects.toMatchObject({ status: 409 });
  expect((await listMembers(scope)).map(({ role }) => role)).toEqual(['owner']);
});

test('nobody of another company can be changed or removed', async () => {
  const { scope } = await companyWithOwner();
  const other = await companyWithOwner();
  await addMember(other.companyId, { email: address(), name: 'Second Owner', role: 'owner' });
  await expect(changeRole(scope, other.ownerId, 'auditor', null)).rejects.toMatchObject({ status: 404 });
  await expect(removeMember(scope, other.ownerId)).rejects.toMatchObject({ status: 404 });
  await expect(requireOnlyHere(scope, other.ownerId)).rejects.toMatchObject({ status: 404 });
});

test('a technician’s account is tied to a technician of the records', async () => {
  const { scope, companyId } = await companyWithOwner();
  const { technicianIds } = await withCompany(scope, (tx) => newPlaces(tx, companyId));
  const invite = (technicianId: string | null) =>
    inviteMember(scope, { email: address(), name: 'Ada Moss', role: 'technician', technicianId });
  await expect(invite(null)).rejects.toMatchObject({ errors: [{ path: 'technicianId' }] });
  await expect(invite(randomUUID())).rejects.toMatchObject({ errors: [{ path: 'technicianId' }] });
  const personId = await invite(technicianIds[0] ?? null);
  expect((await listMembers(scope)).find((member) => member.personId === personId)?.technician).toBe('Ada Moss');
  await changeRole(scope, personId, 'office', technicianIds[0] ?? null);
  expect((await listMembers(scope)).find((member) => member.personId === personId)?.technicianId).toBeNull();
  expect((await listLinkableTechnicians(scope)).map(({ name }) => name)).toEqual([
    'Ada Moss',
    'Ben Oyelaran',
    'Cleo Frei',
  ]);
});

test('a password of somebody in two companies is set from neither', async () => {
  const one = await companyWithOwner();
  const two = await companyWithOwner();
  const email = address();
  const personId = await addMember(one.companyId, { email, name: 'Both Worlds', role: 'office' });
  await expect(requireOnlyHere(one.scope, personId)).resolves.toBeUndefined();
  await addMember(two.companyId, { email, name: 'Both Worlds', role: 'office' });
  await expect(requireOnlyHere(one.scope, personId)).rejects.toMatchObject({ status: 403 });
  await expect(requireOnlyHere(two.scope, personId)).rejects.toMatchObject({ status: 403 });
});

test('a revoked token opens nothing and leaves the list', async () => {
  const { scope, token } = await companyWithOwner();
  const secret = await token('office');
  const [listed] = await listAccessTokens(scope);
  expect(listed).toMatchObject({ label: 'test office', role: 'office' });
  expect(await viewerOfAccessToken(secret)).not.toBeNull();
  await revokeAccessToken(scope, listed?.id ?? '');
  expect(await viewerOfAccessToken(secret)).toBeNull();
  expect(await listAccessTokens(scope)).toEqual([]);
  await expect(revokeAccessToken(scope, listed?.id ?? '')).rejects.toMatchObject({ status: 404 });
});

test('another company’s token cannot be revoked', async () => {
  const { scope } = await companyWithOwner();
  const other = await companyWithOwner();
  await other.token('owner');
  const [listed] = await listAccessTokens(other.scope);
  await expect(revokeAccessToken(scope, listed?.id ?? '')).rejects.toMatchObject({ status: 404 });
  expect(await listAccessTokens(other.scope)).toHaveLength(1);
});

test('the company keeps a zone that exists', async () => {
  const { scope, ownerId } = await companyWithOwner();
  const session = await openSession(ownerId, null);
  await updateCompany(scope, { name: 'Renamed Cooling', timeZone: 'America/Denver', massUnit: 'kg' });
  expect(await viewerOfSession(session)).toMatchObject({
    companyName: 'Renamed Cooling',
    timeZone: 'America/Denver',
    massUnit: 'kg',
  });
  for (const timeZone of ['Mars/Olympus', '+05:00', ''])
    await expect(updateCompany(scope, { name: 'x', timeZone, massUnit: 'kg' })).rejects.toMatchObject({
      errors: [{ path: 'timeZone' }],
    });
});
