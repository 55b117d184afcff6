import { z } from 'zod';
import { addMember, companiesNamed, createCompany, createPasswordLink } from '@/lib/auth/provision';
import { DISPLAY_UNITS } from '@/lib/vocabulary';
import { namedValues } from './arguments';
import { runCommand, UsageError } from './command';
import { say } from './local';

const USAGE =
  'npm run company -- --name "…" --owner-email … [--owner-name "…"] [--time-zone America/Chicago] [--mass-unit lb|kg]';

const isTimeZone = (name: string) => {
  try {
    return Boolean(new Intl.DateTimeFormat('en', { timeZone: name }));
  } catch {
    return false;
  }
};

const wanted = z.object({
  name: z.string().max(200, '--name is longer than 200 characters.'),
  'owner-email': z.email('--owner-email is not an e-mail address.'),
  'owner-name': z.string().max(200, '--owner-name is longer than 200 characters.').optional(),
  'time-zone': z.string().refine(isTimeZone, '--time-zone is no IANA time zone such as America/Chicago.').optional(),
  'mass-unit': z.enum(DISPLAY_UNITS, `--mass-unit is one of ${DISPLAY_UNITS.join(', ')}.`).optional(),
});

const read = () => {
  const values = namedValues(
    {
      name: 'needed',
      'owner-email': 'needed',
      'owner-name': 'optional',
      'time-zone': 'optional',
      'mass-unit': 'optional',
    },
    USAGE,
  );
  const checked = wanted.safeParse(values);
  if (!checked.success) throw new UsageError(checked.error.issues.map(({ message }) => message).join('\n'));
  return checked.data;
};

void runCommand(read, async (given, { address }) => {
  const { name, 'owner-email': email, 'owner-name': ownerName, 'time-zone': zone, 'mass-unit': unit } = given;
  if ((await companiesNamed(name)).length) throw new UsageError(`There is already a company named “${name}”.`);
  const companyId = await createCompany(name, {
    ...(zone ? { timeZone: zone } : {}),
    ...(unit ? { massUnit: unit } : {}),
  });
  const personId = await addMember(companyId, { email, name: ownerName ?? email, role: 'owner' });
  say(`made “${name}”; ${email} owns it. This link sets the password, once, within seven days:`);
  console.log(`${address}/set-password/${await createPasswordLink(companyId, personId)}`);
});
