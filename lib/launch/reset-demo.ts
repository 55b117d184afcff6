import { companiesNamed } from '@/lib/auth/provision';
import { DEMO_COMPANIES, resetDemo } from '@/seed/demo';
import { isDemo } from '@/seed/marker';
import { namedValues } from './arguments';
import { runCommand, UsageError } from './command';
import { say } from './local';

const USAGE = 'npm run demo:reset [-- --company "…"]';

const read = () => namedValues({ company: 'optional' }, USAGE);

void runCommand(read, async ({ company }, { database }) => {
  const named = company === undefined ? [] : await companiesNamed(company);
  if (company !== undefined && !named.length) throw new UsageError(`There is no company named “${company}”.`);
  for (const id of named)
    if (!(await isDemo(id))) throw new UsageError(`“${company}” is not a demo company, so it is left as it is.`);
  say(`removing ${DEMO_COMPANIES.join(' and ')} and making them anew`);
  await resetDemo(database.urls);
  say('the demo is as it was at first');
});
