import { groupBy } from '@/analytics/statistics/group-by';
import { deviations, MAD_TO_SIGMA } from '@/analytics/statistics/robust/deviations';
import type { FlagDecision } from '@/lib/vocabulary';
import type { VisitEvidence } from './leaking-appliances';
import { LEAST_LIKE_VISITS } from './limits';
import { fitShortShare, type ShortShare, shortChance } from './short-share';

/** One recovery as the suspicion reads it. */
export type PulledRecord = {
  applianceId: string;
  recoveredOn: string;
  recoveredMassKg: number;
  fullChargeKg: number;
  /** Appliance category and type of job, '' where not stated. */
  category: string;
  jobType: string;
  refrigerant: string;
  finalVacuumKpaAbs: number | null;
  /** What a person decided about a flag of the record, where one was decided. */
  decision: FlagDecision | null;
  /** Certainties of its open flags that the unit came short, and that the pull was stopped early. */
  judgedShort: number | null;
  judgedStopped: number | null;
};

/** All pulls of one day from one appliance. `evidence` null: the visit does not tell what charge was there. */
export type Visit = { applianceId: string; visitedOn: string; recoveryYield: number; evidence: VisitEvidence | null };

const kindOf = ({ category, jobType }: PulledRecord): string => JSON.stringify([category, jobType]);

/** From so many spreads shallower than like jobs a pull may have stopped before the charge was out. */
const SHALLOW = 1.5;

/** Whether the final vacuum lies far above that of like jobs, so that the yield says nothing of the charge. */
const shallowPulls = (records: readonly PulledRecord[]): ReadonlySet<PulledRecord> => {
  const shallow = new Set<PulledRecord>();
  const stated = records.filter(({ finalVacuumKpaAbs }) => finalVacuumKpaAbs !== null);
  const byKind = groupBy(stated, ({ category, refrigerant }) => JSON.stringify([category, refrigerant]));
  for (const like of byKind.values()) {
    if (like.length < LEAST_LIKE_VISITS) continue;
    const usual = deviations(like.map(({ finalVacuumKpaAbs }) => finalVacuumKpaAbs ?? 0));
    if (!usual.enough) continue;
    const { median, mad } = usual.value;
    for (const pull of like)
      if ((pull.finalVacuumKpaAbs ?? 0) - median > SHALLOW * MAD_TO_SIGMA * mad) shallow.add(pull);
  }
  return shallow;
};

/** More than this share of a full charge is a slip of the pen: a unit or a plate misread. */
const OVER_FULL = 1.15;

type DayPulls = { first: PulledRecord; pulls: readonly PulledRecord[]; recoveryYield: number };

const byDay = (records: readonly PulledRecord[]): DayPulls[] =>
  [...groupBy(records, ({ applianceId, recoveredOn }) => `${applianceId} ${recoveredOn}`).values()].flatMap((pulls) => {
    const [first] = pulls;
    const kg = pulls.reduce((sum, { recoveredMassKg }) => sum + recoveredMassKg, 0);
    return first ? [{ first, pulls, recoveryYield: kg / first.fullChargeKg }] : [];
  });

const NOTHING_TO_DO_WITH_THE_CHARGE: readonly FlagDecision[] = [
  'incomplete_recovery',
  'wrong_nameplate',
  'entry_error',
];

/** What is known of the charge without the yield: decided by a person, or judged by the flags; null when neither. */
const known = (pulls: readonly PulledRecord[]): { short: number } | 'says nothing' | null => {
  const decisions = pulls.flatMap(({ decision }) => decision ?? []);
  if (decisions.includes('leaked_before')) return { short: 1 };
  if (decisions.some((decision) => NOTHING_TO_DO_WITH_THE_CHARGE.includes(decision))) return 'says nothing';
  if (decisions.length) return { short: 0 };
  const stopped = Math.max(0, ...pulls.map(({ judgedStopped }) => judgedStopped ?? 0));
  const short = Math.max(...pulls.map(({ judgedShort }) => judgedShort ?? Number.NEGATIVE_INFINITY));
  if (stopped > Math.max(0.5, short)) return 'says nothing';
  return short >= 0 ? { short } : null;
};

/**
 * Visits with the probability that each found the unit short of charge. It comes from what a person decided about the
 * record's flag, else from the flags' certainty, else from the yield against like jobs (same appliance category and type
 * of job, else same type of job, else all). A pull that stayed far shallower than like jobs may have been stopped early: it
 * says nothing of the charge.
 */
export const visitsOf = (records: readonly PulledRecord[]): Visit[] => {
  const shallow = shallowPulls(records);
  const days = byDay(records);
  const telling = days.filter(
    ({ pulls, recoveryYield }) => recoveryYield <= OVER_FULL && !pulls.some((pull) => shallow.has(pull)),
  );
  const fits = new Map<string, ShortShare>();
  const fitAll = (keyOf: (pull: PulledRecord) => string) => {
    for (const [key, like] of groupBy(telling, ({ first }) => keyOf(first))) {
      const fit = fitShortShare(like.map(({ recoveryYield }) => recoveryYield));
      if (fit.enough) fits.set(key, fit.value);
    }
  };
  const wider = [kindOf, ({ jobType }: PulledRecord) => JSON.stringify([jobType]), () => '[]'];
  for (const keyOf of wider) fitAll(keyOf);

  return days.map(({ first, pulls, recoveryYield }): Visit => {
    const visit = { applianceId: first.applianceId, visitedOn: first.recoveredOn, recoveryYield };
    const told = known(pulls);
    const usual = wider.map((keyOf) => fits.get(keyOf(first))).find((fit) => fit !== undefined);
    if (told === 'says nothing' || !usual) return { ...visit, evidence: null };
    if (!told && (recoveryYield > OVER_FULL || pulls.some((pull) => shallow.has(pull))))
      return { ...visit, evidence: null };
    const short = told?.short ?? shortChance(recoveryYield, usual);
    return { ...visit, evidence: { kind: kindOf(first), short, usualShare: usual.share } };
  });
};
