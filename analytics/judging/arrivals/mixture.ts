/**
 * What a company's pulls are made of, fitted to its records. A system comes sound, leaked or nearly empty; somebody
 * pulls it thoroughly or stops early. Plain data: it is stored and read again.
 */
export type ArrivalMixture = {
  /** Density of the yield of sound systems, by kind of appliance; `all` for a kind without its own. */
  sound: Record<string, number[]>;
  soundMean: Record<string, number>;
  leaked: number[];
  empty: number[];
  /** Shares by job type; `all` for one that is new. */
  shares: Record<string, ArrivalShares>;
  /** Share of pulls stopped early: of the company, and of each technician drawn towards it. */
  stopsEarly: number;
  stopsEarlyOf: Record<string, { pulls: number; stopped: number }>;
  /** What each technician's thorough pulls leave short of the top, against the crew's: 1 is usual, 2 twice as much. */
  leavesOf: Record<string, number>;
  /** How often each technician meets units that came short, against others on the same types of job: 1 is usual. */
  meetsShortOf: Record<string, number>;
  /** Share of the usual vacuum that is missing when nothing is pulled at all. */
  vacuumLoss: number;
  /** Spread of the vacuum of early stops, in spreads of usual ones. */
  stoppedSpread: number;
};
export type ArrivalShares = { sound: number; leaked: number; empty: number };

/** What is seen of one pull. */
export type Pull = {
  kind: string;
  job: string;
  recoveryYield: number;
  vacuum: { z: number /** The usual depth in its own spreads. */; usual: number } | null;
  /** Share of this person's pulls that are stopped early. */
  stopsEarly: number;
  /** What this person's thorough pulls leave, against the crew's. */
  leaves: number;
  /** How often this person meets units that came short, against others. */
  meetsShort: number;
};

/** What is known of a technician beside early stops, as a pull takes it. */
export const personOf = (mixture: ArrivalMixture, technicianId: string): Pick<Pull, 'leaves' | 'meetsShort'> => ({
  leaves: mixture.leavesOf[technicianId] ?? 1,
  meetsShort: mixture.meetsShortOf[technicianId] ?? 1,
});
