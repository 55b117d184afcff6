import { READING_TOLERANCE_KPA } from '@/lib/trade/evacuation-level';
import { groupBy } from '../../statistics/group-by';
import { kindKey } from '../kinds';
import type { JudgedRecord } from '../record';
import type { JudgingSettings } from '../settings';

/** What a company's records usually state and reach; shares of those that could. */
export type Habits = {
  /** Share that states a hold, by year. */
  holdStated: Record<string, number>;
  /** Share of stated vacuums that reach the level, by kind and level. */
  levelReached: Record<string, number>;
  firstDay: string | null;
};

export const levelKey = (record: JudgedRecord, settings: JudgingSettings): string =>
  `${kindKey(record, record.fullChargeKg, settings)}/${Math.round(record.requiredLevelKpaAbs ?? -1)} kPa`;

const shares = (
  groups: Map<string, JudgedRecord[]>,
  isMet: (record: JudgedRecord) => boolean,
  least: number,
): Record<string, number> =>
  Object.fromEntries(
    [...groups]
      .filter(([, group]) => group.length >= least)
      .map(([key, group]) => [key, group.filter(isMet).length / group.length]),
  );

/** How far the final vacuum stays above the required level, kPa; negative when it was reached, null where unknown. */
export const aboveLevelKpa = ({ finalVacuumKpaAbs, requiredLevelKpaAbs }: JudgedRecord): number | null =>
  finalVacuumKpaAbs === null || requiredLevelKpaAbs === null ? null : finalVacuumKpaAbs - requiredLevelKpaAbs;

const reached = (record: JudgedRecord): boolean => (aboveLevelKpa(record) ?? 0) <= READING_TOLERANCE_KPA;

/** Reads off the records what this company usually writes down and reaches. */
export const fitHabits = (records: readonly JudgedRecord[], settings: JudgingSettings): Habits => {
  const stated = records.filter((record) => aboveLevelKpa(record) !== null);
  const days = records.map(({ recoveredOn }) => recoveredOn).sort();
  return {
    holdStated: shares(
      groupBy(records, ({ recoveredOn }) => recoveredOn.slice(0, 4)),
      ({ holdMinutes }) => holdMinutes !== null,
      settings.leastPeers,
    ),
    levelReached: shares(
      groupBy(stated, (record) => levelKey(record, settings)),
      reached,
      settings.leastPeers,
    ),
    firstDay: days[0] ?? null,
  };
};
