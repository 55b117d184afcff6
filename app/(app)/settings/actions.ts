'use server';

import { refresh } from 'next/cache';
import { z } from 'zod';
import { revokeAccessToken, updateCompany } from '@/lib/auth/company-settings';
import { changeRole, inviteMember, removeMember, requireOnlyHere } from '@/lib/auth/members';
import { createAccessToken, createPasswordLink } from '@/lib/auth/provision';
import { env } from '@/lib/env';
import { DISPLAY_UNITS, ROLES } from '@/lib/vocabulary';
import { ownerAction } from './owner-action';

const text = (most: number, missing: string) =>
  z.string().trim().min(1, missing).max(most, `At most ${most} characters.`);
const personId = z.uuid();
const role = z.enum(ROLES, 'Choose a role.');
const technicianId = z
  .union([z.uuid(), z.literal('')])
  .optional()
  .transform((id) => id || null);

const linkFor = (token: string) => new URL(`/set-password/${token}`, env().NEXTAUTH_URL).href;

const invited = z.object({
  name: text(100, 'Write the person’s name.'),
  email: z.email('Write an e-mail address, for example name@company.com.').max(200),
  role,
  technicianId,
});

/** Adds a person and gives the link with which he sets a password. */
export const addPerson = ownerAction(invited, async (member, { scope }) => {
  const id = await inviteMember(scope, member);
  const token = await createPasswordLink(scope.companyId, id);
  refresh();
  return { done: `${member.name} was added. Hand over this link: it sets the password.`, secret: linkFor(token) };
});

/** Gives a person another role, from the next request on. */
export const setRole = ownerAction(z.object({ personId, role, technicianId }), async (change, { scope }) => {
  await changeRole(scope, change.personId, change.role, change.technicianId);
  refresh();
  return { done: 'The role was changed. It holds from the next click on.' };
});

/** Takes a person out of the company. */
export const removePerson = ownerAction(z.object({ personId }), async (person, { scope }) => {
  await removeMember(scope, person.personId);
  refresh();
  return { done: 'The person was removed and can open nothing of this company any more.' };
});

/** A link with which the person sets a new password. */
export const renewPassword = ownerAction(z.object({ personId }), async (person, { scope }) => {
  await requireOnlyHere(scope, person.personId);
  const token = await createPasswordLink(scope.companyId, person.personId);
  return { done: 'Hand over this link: it sets a new password and ends open sessions.', secret: linkFor(token) };
});

const described = z.object({
  name: text(120, 'Write the company’s name.'),
  timeZone: z.string(),
  massUnit: z.enum(DISPLAY_UNITS, 'Choose a unit.'),
});

/** Name, time zone and unit of the company. */
export const saveCompany = ownerAction(described, async (company, { scope }) => {
  await updateCompany(scope, company);
  refresh();
  return { done: 'Saved.' };
});

// A technician's records are his own: a program works for the company, not for one of the crew.
const tokenRole = z.enum(
  ROLES.filter((one) => one !== 'technician'),
  'Choose a role.',
);

/** A bearer token for a program, shown once. */
export const addToken = ownerAction(
  z.object({ label: text(80, 'Write what the token is for.'), role: tokenRole }),
  async (token, { viewer, scope }) => {
    const secret = await createAccessToken(scope.companyId, { ...token, createdBy: viewer.actor });
    refresh();
    return { done: 'Copy the token now: it is shown this once only.', secret };
  },
);

/** Closes a token for good. */
export const revokeToken = ownerAction(z.object({ tokenId: z.uuid() }), async ({ tokenId }, { scope }) => {
  await revokeAccessToken(scope, tokenId);
  refresh();
  return { done: 'The token was revoked and opens nothing any more.' };
});
