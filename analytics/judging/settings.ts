/** Everything that judging may be told, in one place; stored with the baselines, so that flags can be made again. */
export type JudgingSettings = {
  /** The company's local date; a record after it is dated wrongly. */
  today: string;
  /** Fewer like jobs than this, and the next wider group is asked. */
  leastPeers: number;
  /** Years of records that like jobs are taken from, the record's own one included. */
  peerYears: number;
  /** Full charge from which an appliance is large plant. */
  plantKg: number;
  /** Yield above which more came out than an overcharged system holds. */
  mostYield: number;
  /** An early stop is said from this certainty on. */
  raiseStopsFrom: number;
  /** A slip of the pen is said from this certainty on: a glance at the ticket settles it. */
  raiseSlipsFrom: number;
  /** Spread of one reading of a scale around what stands on it: at least so much, and this share of the gross weight. */
  repeatabilityKg: number;
  repeatabilityShare: number;
  /** Share of like records that must reach the level, or state a hold, before a single miss says anything. */
  habitFrom: number;
};

/** 20 like jobs within 36 months; 100 lb for large plant; yields above 1.15 are no overcharge (common practice). */
export const defaultSettings = (today: string): JudgingSettings => ({
  today,
  leastPeers: 20,
  peerYears: 3,
  plantKg: 45.359237,
  mostYield: 1.15,
  raiseStopsFrom: 0.4,
  raiseSlipsFrom: 0.3,
  repeatabilityKg: 0.025,
  repeatabilityShare: 0.0004,
  habitFrom: 0.8,
});
