import { totalMassOf } from './calibration';
import { largeKg, type MassHistory, refrigerantsOf } from './history';
import { SEASON_NEEDS } from './season';
import type { TrackRecord } from './track-record';

/** What a reader must know beside the figures. */
export type Caution =
  | { kind: 'no season yet'; months: number; needs: number }
  | { kind: 'lost months'; months: number }
  | { kind: 'range not known yet' }
  | { kind: 'held at three times the best year' }
  /** Too few months with any to say more than their share of the whole. */
  | { kind: 'hardly seen'; refrigerants: string[] }
  | { kind: 'not seen for two years'; refrigerants: string[] };

/** Months with mass below which a refrigerant has no course of its own. */
const DEMANDS_NEEDED = 3;
const GONE_MONTHS = 24;

/** Positions of the months in which a refrigerant was recovered. */
const monthsSeen = (history: MassHistory, refrigerant: string): number[] => {
  const routine = history.routineKg.get(refrigerant);
  return largeKg(history, refrigerant).flatMap((mass, at) => (mass + (routine?.[at] ?? 0) > 0 ? [at] : []));
};

/** The cautions of a forecast, those of the whole before those of single refrigerants. */
export const cautionsOf = (history: MassHistory, record: TrackRecord, isHeldBack: boolean): Caution[] => {
  const { months, lost } = history;
  const cautions: Caution[] = [];
  if (months < SEASON_NEEDS) cautions.push({ kind: 'no season yet', months, needs: SEASON_NEEDS });
  if (lost.size > 0) cautions.push({ kind: 'lost months', months: lost.size });
  if (totalMassOf(record, 0, 0.8) === null) cautions.push({ kind: 'range not known yet' });
  if (isHeldBack) cautions.push({ kind: 'held at three times the best year' });
  const seen = refrigerantsOf(history).map((refrigerant) => ({ refrigerant, at: monthsSeen(history, refrigerant) }));
  const gone = seen.filter(({ at }) => at.length > 0 && (at.at(-1) ?? 0) < months - GONE_MONTHS);
  const rare = seen.filter((own) => own.at.length < DEMANDS_NEEDED && !gone.includes(own));
  const names = (some: typeof seen) => some.map(({ refrigerant }) => refrigerant);
  if (rare.length > 0) cautions.push({ kind: 'hardly seen', refrigerants: names(rare) });
  if (gone.length > 0) cautions.push({ kind: 'not seen for two years', refrigerants: names(gone) });
  return cautions;
};
