import { median } from 'simple-statistics';
import { groupBy } from '../../statistics/group-by';
import { isLowPressure, isPlant, kindKey, vacuumDepthKpa } from '../kinds';
import type { JudgedRecord } from '../record';
import type { JudgingSettings } from '../settings';

/** What final vacuum is usual for a kind of appliance: depth below the atmosphere in kPa. */
export type VacuumGroup = { records: number; usualKpa: number; spreadKpa: number };
export type VacuumGroups = Record<string, VacuumGroup>;

/** A gauge is not read better than this. */
const LEAST_SPREAD_KPA = 0.3;
/** Scales the median deviation to the standard deviation of a normal distribution. */
const NORMAL = 1.4826;

/** What is alike, narrowest first. */
const LEVELS = ['pressure class', 'kind', 'size'] as const;
type Level = (typeof LEVELS)[number];

const keyOf = (record: JudgedRecord, chargeKg: number, level: Level, settings: JudgingSettings): string => {
  if (level === 'size') return isPlant(chargeKg, settings) ? 'plant' : 'routine';
  const kind = kindKey(record, chargeKg, settings);
  return level === 'kind' ? kind : `${kind}/${isLowPressure(record) ? 'low pressure' : 'other'}`;
};

/** Medians and spreads of the final vacuum: by kind and pressure class, wider where those are few. */
export const fitVacuumGroups = (records: readonly JudgedRecord[], settings: JudgingSettings): VacuumGroups => {
  const groups: VacuumGroups = {};
  for (const level of LEVELS) {
    for (const [key, group] of groupBy(records, (r) => keyOf(r, r.fullChargeKg, level, settings))) {
      const depths = group.map(vacuumDepthKpa).filter((depth) => depth !== null);
      if (depths.length < settings.leastPeers) continue;
      const usualKpa = median(depths);
      const spread = NORMAL * median(depths.map((depth) => Math.abs(depth - usualKpa)));
      groups[key] = { records: depths.length, usualKpa, spreadKpa: Math.max(spread, LEAST_SPREAD_KPA) };
    }
  }
  return groups;
};

/** A record's vacuum against the usual one, in spreads: negative is shallow. */
export type VacuumReading = VacuumGroup & { depthKpa: number; z: number };

/** How this vacuum compares if the appliance holds `chargeKg`; null without a reading or without enough like ones. */
export const readVacuum = (
  groups: VacuumGroups,
  record: JudgedRecord,
  chargeKg: number,
  settings: JudgingSettings,
): VacuumReading | null => {
  const depthKpa = vacuumDepthKpa(record);
  if (depthKpa === null) return null;
  const group =
    groups[keyOf(record, chargeKg, 'pressure class', settings)] ??
    groups[keyOf(record, chargeKg, 'kind', settings)] ??
    groups[keyOf(record, chargeKg, 'size', settings)];
  return group ? { ...group, depthKpa, z: (depthKpa - group.usualKpa) / group.spreadKpa } : null;
};
