import { companiesNamed, createAccessToken } from '@/lib/auth/provision';
import { ROLES, type Role } from '@/lib/vocabulary';
import { namedValues } from './arguments';
import { runCommand, UsageError } from './command';

const USAGE = `npm run token -- --company "…" --role ${ROLES.join('|')} [--label "…"]`;
const isRole = (word: string): word is Role => (ROLES as readonly string[]).includes(word);

const read = () => {
  const {
    company = '',
    role = '',
    label,
  } = namedValues({ company: 'needed', role: 'needed', label: 'optional' }, USAGE);
  if (!isRole(role)) throw new UsageError(`“${role}” is no role; roles are ${ROLES.join(', ')}.`);
  return { company, role, label };
};

// Nothing but the token goes to standard output, so that a script can take it.
void runCommand(read, async ({ company, role, label }) => {
  const [companyId, another] = await companiesNamed(company);
  if (!companyId) throw new UsageError(`There is no company named “${company}”.`);
  if (another) throw new UsageError(`Two companies are named “${company}”; rename one of them first.`);
  console.log(await createAccessToken(companyId, { role, label: label ?? `command line, ${role}` }));
});
