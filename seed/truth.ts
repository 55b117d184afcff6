/** What a ticket may say wrongly, and what may have gone wrong at the job. */
export const PLANTED_FAULTS = [
  'stopped_early',
  'ounces_as_pounds',
  'kilograms_as_pounds',
  'tenfold',
  'swapped_digits',
  'nameplate_slip',
  'doubled',
  'mixed_cylinder',
  'overfilled',
  'refused',
] as const;
export type PlantedFault = (typeof PLANTED_FAULTS)[number];

/** How somebody works; only tests know it. */
export type Habit =
  | 'ordinary'
  | 'cuts_hold_short'
  | 'coached'
  | 'leak_specialist'
  | 'large_plant'
  | 'drifting_scale'
  | 'newcomer';

/** What was planted, so that a test can ask whether it is found. */
export type DemoTruth = {
  faults: { recordRef: string; fault: PlantedFault /** Column of a refused row. */; column?: string }[];
  /** Systems that had lost charge before anybody came: low yields that are nobody's fault. */
  shortOnArrival: string[];
  technicians: { name: string; habit: Habit; coachedOn: string | null; pulls: number; meanEfficiency: number }[];
  driftingScale: { technician: string; fromMonth: string; factor: number } | null;
  /** Recovered mass in kg as it truly was, by month and refrigerant, whatever the tickets say. */
  monthlyMassKg: Record<string, Record<string, number>>;
  /** Units that lose charge again and again, as `site / unit`. */
  chronicLeaks: string[];
};

/** Refs of the records planted with one of the faults. */
export const refsWith = (truth: DemoTruth, ...faults: PlantedFault[]): Set<string> =>
  new Set(truth.faults.filter(({ fault }) => faults.includes(fault)).map(({ recordRef }) => recordRef));
