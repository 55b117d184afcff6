import type { Role } from '@/lib/vocabulary';
import { ROLE_NAMES } from '@/lib/wording';
import { Empty } from './states';

/** Says calmly that a screen is not for somebody's role, and who can change that. */
export const NotForRole = ({ screen, role }: { screen: string; role: Role }) => (
  <Empty title={`${screen} is not part of your role`}>
    You are here as {ROLE_NAMES[role].toLowerCase()}. The owner of the company can give you another role.
  </Empty>
);
