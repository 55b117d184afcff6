import type { Action } from '@/lib/auth/permissions';

/** A screen of the product: where it is, what it is called and which action opens it. */
export type Screen = {
  path: string;
  name: string;
  action: Action;
  /** The scope in the address means something here, so links carry it along. */
  scoped: boolean;
};

/** All screens in the order in which they are offered. */
export const SCREENS: readonly Screen[] = [
  { path: '/', name: 'Today', action: 'records:read', scoped: false },
  { path: '/trends', name: 'Trends', action: 'trends:read', scoped: true },
  { path: '/low-recoveries', name: 'Low recoveries', action: 'flags:read', scoped: true },
  { path: '/technicians', name: 'Technicians', action: 'technicians:read', scoped: true },
  { path: '/sites', name: 'Sites', action: 'sites:read', scoped: true },
  { path: '/appliances', name: 'Appliances', action: 'appliances:read', scoped: true },
  { path: '/records', name: 'Records', action: 'records:read', scoped: true },
  { path: '/imports', name: 'Imports', action: 'imports:manage', scoped: false },
  { path: '/settings', name: 'Settings', action: 'company:manage', scoped: false },
];

/** The screens that somebody with these actions may open. */
export const screensFor = (allowed: readonly Action[]): Screen[] =>
  SCREENS.filter((screen) => allowed.includes(screen.action));
