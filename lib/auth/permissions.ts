import type { Role } from '@/lib/vocabulary';

/** Everything the product lets somebody do. Pages, handlers and actions ask `may`; nothing else decides. */
export const ACTIONS = [
  'trends:read',
  'technicians:read',
  'technician:read',
  'sites:read',
  'appliances:read',
  'flags:read',
  'flags:decide',
  'records:read',
  'records:write',
  'records:export',
  'imports:manage',
  'notes:read',
  'notes:write',
  'coaching:read',
  'coaching:write',
  'leaks:read',
  'leaks:write',
  'company:manage',
] as const;
export type Action = (typeof ACTIONS)[number];

/**
 * Who may do what. A technician's `records:*` and `coaching:read` reach only what is his own: row-level security
 * narrows his transactions to it (see `technicianId` of the viewer). `technician:read` is the page of one technician; a
 * technician opens his own only.
 */
export const PERMISSIONS: Record<Role, readonly Action[]> = {
  owner: ACTIONS,
  operations: [
    'trends:read',
    'technicians:read',
    'technician:read',
    'sites:read',
    'appliances:read',
    'flags:read',
    'flags:decide',
    'records:read',
    'records:write',
    'records:export',
    'imports:manage',
    'notes:read',
    'notes:write',
    'coaching:read',
    'coaching:write',
    'leaks:read',
    'leaks:write',
  ],
  trainer: [
    'trends:read',
    'technicians:read',
    'technician:read',
    'sites:read',
    'appliances:read',
    'flags:read',
    'flags:decide',
    'records:read',
    'records:export',
    'notes:read',
    'notes:write',
    'coaching:read',
    'coaching:write',
    'leaks:read',
  ],
  technician: ['flags:read', 'records:read', 'records:write', 'records:export', 'coaching:read', 'technician:read'],
  office: [
    'trends:read',
    'sites:read',
    'appliances:read',
    'records:read',
    'records:write',
    'records:export',
    'imports:manage',
    'notes:read',
    'leaks:read',
    'leaks:write',
  ],
  auditor: ['records:read', 'records:export', 'leaks:read'],
};

/** Whether a role includes an action. */
export const may = (role: Role, action: Action): boolean => PERMISSIONS[role].includes(action);
