import { plural } from '@/lib/format';
import type { ApplianceRow } from './contract';

type Judged = Pick<ApplianceRow, 'lowRecoveries' | 'recoveredMass'>;

/** Appliances in the order of how often they came back far below like jobs, then of their mass. */
export const mostLowFirst = <Row extends Judged>(items: readonly Row[]): Row[] =>
  [...items].sort((a, b) => b.lowRecoveries - a.lowRecoveries || b.recoveredMass - a.recoveredMass);

/** How many units came back far below like jobs, and how many more than once. */
export const lowAgainNote = (items: readonly Judged[]): string => {
  const once = items.filter(({ lowRecoveries }) => lowRecoveries > 0).length;
  const again = items.filter(({ lowRecoveries }) => lowRecoveries > 1).length;
  if (once === 0) return 'None of them came back far below like jobs.';
  const low = `${plural(once, 'unit', 'units')} came back far below like jobs`;
  if (again === 0) return `${low}, ${once === 1 ? 'once' : 'none of them more than once'}.`;
  return again === once ? `${low} more than once.` : `${low}, ${plural(again, 'of them', 'of them')} more than once.`;
};
