import { formatMassWithUnit, formatNumber, formatPercent } from '@/lib/format';
import { KPA } from '@/lib/units';
import type { DisplayUnit } from '@/lib/vocabulary';
import type { Peers } from '../baselines/peers';

const SMALL_KG = 1;

/** A mass for a sentence: hundredths for what is light. */
export const massText = (kg: number, unit: DisplayUnit): string =>
  formatMassWithUnit(kg, unit, Math.abs(kg) < SMALL_KG ? 2 : 1);

/** Above this absolute pressure a vacuum is read in inches of mercury below the atmosphere. */
const DEEP_KPA = 10;

/** A final vacuum as gauges in the trade show it: inches of mercury, millimetres absolute where it is deep, psig above. */
export const vacuumText = (kpaAbs: number): string => {
  if (kpaAbs < DEEP_KPA) return `${formatNumber(kpaAbs / KPA.mmHg)} mm Hg absolute`;
  if (kpaAbs > KPA.atmosphere) return `${formatNumber((kpaAbs - KPA.atmosphere) / KPA.psi, 1)} psig`;
  return `${formatNumber((KPA.atmosphere - kpaAbs) / KPA.inHg, 1)} inHg`;
};

const ALIKE: Record<Peers['alike'], string> = {
  'category and job type': 'like jobs',
  'job type': 'jobs of this type',
  company: 'all jobs',
};

/** What is usual among like jobs, in a sentence; empty where nothing is known. */
export const peersSentence = (peers: Peers | null): string => {
  if (!peers) return '';
  const { fromYear, toYear } = peers;
  const years = fromYear === toYear ? String(fromYear) : `${fromYear} to ${toYear}`;
  return `Half of ${ALIKE[peers.alike]} (${peers.records}, ${years}) gave between ${formatPercent(peers.lowerQuartile)} and ${formatPercent(peers.upperQuartile)}.`;
};

/** Sentences put together; empty ones left out. */
export const sentences = (...parts: readonly string[]): string => parts.filter((part) => part !== '').join(' ');
