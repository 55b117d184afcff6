/** What company to simulate. The same seed and options give the same file, to the last digit. */
export type SimulationOptions = {
  /** About how many records. */
  size: number;
  /** First and last month of records, `YYYY-MM`. */
  firstMonth: string;
  lastMonth: string;
  /** Share of rows that are written wrongly. */
  slipShare: number;
  /** Whether a poor technician, an early stopper and a drifting scale are among the crew. */
  plantsPeople: boolean;
};

/** Twelve years of a contractor of middling size. */
export const usualOptions: SimulationOptions = {
  size: 4_000,
  firstMonth: '2015-01',
  lastMonth: '2026-11',
  slipShare: 0.012,
  plantsPeople: true,
};

/** What may be wrong with a row: the pull itself stopped early, or one of the slips of the pen. */
export const SIMULATED_FAULTS = [
  'stopped_early',
  'decimal_low',
  'decimal_high',
  'kg_as_lb',
  'oz_as_lb',
  'swapped_weights',
  'zero_recovered',
  'duplicate',
  'nameplate_x10',
  'nameplate_digits_swapped',
] as const;
export type SimulatedFault = (typeof SIMULATED_FAULTS)[number];

export const CREW_CLASSES = [
  'ordinary',
  'bad_low_skill',
  'bad_stops_early',
  'leak_specialist_good',
  'large_plant_specialist',
  'scale_drifts_low',
] as const;
export type CrewClass = (typeof CREW_CLASSES)[number];
