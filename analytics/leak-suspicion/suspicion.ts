import { type Estimate, enough, tooFew } from '@/analytics/statistics/estimate';
import { groupBy } from '@/analytics/statistics/group-by';
import { type LeakModel, leakingAppliances } from './leaking-appliances';
import { LEAST_SHORT_VISITS, LEAST_VISITS, SHORT_FROM, SUSPECTED_FROM } from './limits';
import { type PulledRecord, type Visit, visitsOf } from './visits';

/** What the visits say of one appliance. */
export type ApplianceSuspicion = {
  applianceId: string;
  /** Visits that tell what charge was there, the earliest first. */
  visits: Visit[];
  /** How many of them found it short, more likely than not. */
  shortVisits: number;
  /** How many would be usual for jobs like these. */
  expectedShort: number;
  /** Probability that it leaks; too few visits, or too few short ones, say nothing. */
  chance: Estimate<number>;
};

export type LeakSuspicion = { appliances: Map<string, ApplianceSuspicion>; model: LeakModel | null };

/** Whether an appliance is listed as suspected. */
export const isSuspected = ({ chance }: ApplianceSuspicion): boolean => chance.enough && chance.value >= SUSPECTED_FROM;

const counted = (visits: readonly Visit[]) =>
  visits.filter(({ evidence }) => (evidence?.short ?? 0) >= SHORT_FROM).length;

/** A pattern takes several visits: from one alone, or with one short one alone, nothing is said. */
const stated = (visits: readonly Visit[], chance: number): Estimate<number> => {
  if (visits.length < LEAST_VISITS) return tooFew(LEAST_VISITS, visits.length, 'visits');
  return enough(counted(visits) < LEAST_SHORT_VISITS ? 0 : chance);
};

/**
 * The suspicion that appliances leak, from their recoveries: units that come back short again and again, beyond what jobs
 * like theirs do. Says nothing of anybody's work.
 */
export const leakSuspicion = (records: readonly PulledRecord[]): LeakSuspicion => {
  const telling = visitsOf(records).filter(({ evidence }) => evidence !== null);
  const groups = [...groupBy(telling, ({ applianceId }) => applianceId)];
  const fitted = leakingAppliances(groups.map(([, visits]) => visits.flatMap(({ evidence }) => evidence ?? [])));
  const model = fitted.enough ? fitted.value.model : null;
  const appliances = groups.map(([applianceId, visits], index): [string, ApplianceSuspicion] => {
    const usual = (visit: Visit) =>
      model?.shortOtherwise[visit.evidence?.kind ?? ''] ?? visit.evidence?.usualShare ?? 0;
    return [
      applianceId,
      {
        applianceId,
        visits: [...visits].sort((a, b) => a.visitedOn.localeCompare(b.visitedOn)),
        shortVisits: counted(visits),
        expectedShort: visits.reduce((total, visit) => total + usual(visit), 0),
        chance: fitted.enough ? stated(visits, fitted.value.chances[index] ?? 0) : fitted,
      },
    ];
  });
  return { appliances: new Map(appliances), model };
};
