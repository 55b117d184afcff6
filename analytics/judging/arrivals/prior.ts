import type { Pull } from './mixture';

/** A pull to learn from. */
export type SeenPull = Omit<Pull, 'stopsEarly' | 'leaves' | 'meetsShort'> & { technicianId: string };

/** What a fit starts from and leans on where records are few: common practice of the trade. */
export const PRIOR = {
  sound: { mean: 0.92, variance: 0.0045, pulls: 30 },
  leaked: { mean: 0.54, variance: 0.036, pulls: 60 },
  empty: { mean: 0.07, variance: 0.004, pulls: 60 },
  shares: { sound: 0.72, leaked: 0.22, empty: 0.06, pulls: 20 },
  stopsEarly: { share: 0.012, pulls: 400 },
  leaves: { pulls: 15 },
  meetsShort: { pulls: 5 },
  /** As if some twenty early stops on routine units had shown it. */
  vacuumLoss: { value: 0.55, weight: 600 },
  stoppedSpread: { value: 1.15, pulls: 10 },
} as const;
