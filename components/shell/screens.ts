import type { Action } from '@/lib/auth/permissions';

/** A screen of the product: where it is, what it is called and which action opens it. */
export type Screen = {
  path: string;
  name: string;
  action: Action;
  /** Not offered to who may do this: he has the wider screen. */
  unless?: Action;
  /** Where the screen leads, when that is elsewhere: it is the open one there too. */
  within?: string;
  /** The scope in the address means something here, so links carry it along. */
  scoped: boolean;
  /** The key that leads here after `g`. */
  goKey?: string;
};

/** All screens in the order in which they are offered. */
export const SCREENS: readonly Screen[] = [
  { path: '/', name: 'Today', action: 'records:read', scoped: false, goKey: 'd' },
  { path: '/trends', name: 'Trends', action: 'trends:read', scoped: true, goKey: 't' },
  { path: '/flags', name: 'Flags', action: 'flags:read', scoped: true, goKey: 'f' },
  { path: '/technicians', name: 'Technicians', action: 'technicians:read', scoped: true, goKey: 'c' },
  {
    path: '/technicians/me',
    name: 'My work',
    action: 'technician:read',
    unless: 'technicians:read',
    within: '/technicians',
    scoped: true,
    goKey: 'w',
  },
  { path: '/sites', name: 'Sites', action: 'sites:read', scoped: true, goKey: 's' },
  { path: '/appliances', name: 'Appliances', action: 'appliances:read', scoped: true, goKey: 'a' },
  { path: '/records', name: 'Records', action: 'records:read', scoped: true, goKey: 'r' },
  { path: '/imports', name: 'Imports', action: 'imports:manage', scoped: false, goKey: 'i' },
  { path: '/settings', name: 'Settings', action: 'company:manage', scoped: false, goKey: 'e' },
];

/** The screens that somebody with these actions may open. */
export const screensFor = (allowed: readonly Action[]): Screen[] =>
  SCREENS.filter(({ action, unless }) => allowed.includes(action) && !(unless && allowed.includes(unless)));
