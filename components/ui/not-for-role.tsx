import type { Role } from '@/lib/vocabulary';
import { ROLE_NAMES } from '@/lib/wording';
import { PageHead } from './page-head';

/** Says calmly that a screen is not for somebody's role, and who can change that. */
export const NotForRole = ({ screen, role }: { screen: string; role: Role }) => (
  <PageHead
    title={`${screen} is not part of your role.`}
    sub={`You are here as ${ROLE_NAMES[role].toLowerCase()}. The owner of the company can give you another role.`}
  />
);
