import { KPA } from '@/lib/units';
import type { JudgedRecord } from './record';
import type { JudgingSettings } from './settings';

const UNSTATED = 'unstated';

export const categoryKey = ({ category }: Pick<JudgedRecord, 'category'>): string => category ?? UNSTATED;
export const jobKey = ({ jobType }: Pick<JudgedRecord, 'jobType'>): string => jobType ?? UNSTATED;

/** Whether a charge is that of large plant, which is pulled deeper and weighed on another scale. */
export const isPlant = (chargeKg: number, settings: JudgingSettings): boolean => chargeKg >= settings.plantKg;

/** Appliances that are pulled alike: a category, large plant apart. */
export const kindKey = (record: JudgedRecord, chargeKg: number, settings: JudgingSettings): string =>
  `${categoryKey(record)}/${isPlant(chargeKg, settings) ? 'plant' : 'routine'}`;

/** A level this deep is asked of low pressure appliances only: 25 mm Hg absolute, 40 CFR 82.156 Table 1. */
const DEEP_LEVEL_KPA = 10;

/** Low pressure appliances are pulled to a level of their own. */
export const isLowPressure = ({ requiredLevelKpaAbs }: JudgedRecord): boolean =>
  requiredLevelKpaAbs !== null && requiredLevelKpaAbs < DEEP_LEVEL_KPA;

/** Depth of the final vacuum below the standard atmosphere, kPa; null where none is recorded. */
export const vacuumDepthKpa = ({ finalVacuumKpaAbs }: JudgedRecord): number | null =>
  finalVacuumKpaAbs === null ? null : KPA.atmosphere - finalVacuumKpaAbs;
