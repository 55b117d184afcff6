/** A job against what is usual for it: yield and vacuum as given, what is expected of both, and how often what happens. */
export type Seen = {
  value: number;
  /** Yield of a full pull, with the technician's own level, and its usual deviation. */
  expected: number;
  deviation: number;
  /** How much shallower than his own usual the vacuum is, in usual deviations; NaN where that is not told. */
  shallower: number;
  /** By how many usual deviations a vacuum is shallower for each share of the charge that a stopped pull leaves. */
  shallowerPerShare: number;
  /** Share of units that come short, and of pulls on the others that are stopped early. */
  shortShare: number;
  earlyShare: number;
};

/** A pull that is stopped early leaves at least this share. */
const EARLY_AT_MOST = 0.85;
/** The vacuum of a stopped pull strays further about what it should be than that of a full one. */
const EARLY_DEVIATION = 1.25;
/** Vacuums further off than this tell no more than one at it, so that no single reading decides. */
const VACUUM_BOUND = 4;
const ROOT_TWO_PI = Math.sqrt(2 * Math.PI);

/** Normal distribution function, near enough for a chance and quick: Bowling et al. (2009), JIEM 2, 114-127. */
const cdf = (value: number): number => 1 / (1 + Math.exp(-1.702 * value));
const density = (value: number): number => Math.exp(-0.5 * value * value) / ROOT_TWO_PI;
const bounded = (value: number): number => Math.max(-VACUUM_BOUND, Math.min(VACUUM_BOUND, value));

/** Written into, not made anew: it is asked a million times. */
export type Chances = { short: number; early: number };

/**
 * Chances that the unit came short and that the pull was stopped early, by Bayes' rule from how likely each makes what is
 * seen. A full pull lies about the expected yield, at the usual vacuum; a short unit anywhere below it, at the usual
 * vacuum; an early stop anywhere below it, at a vacuum the shallower the more was left.
 */
export const weigh = (seen: Seen, into: Chances): void => {
  const { value, expected, deviation, shallower, shallowerPerShare, shortShare, earlyShare } = seen;
  const told = !Number.isNaN(shallower);
  const left = Math.max(0, 1 - value / expected);
  const usual = told ? density(bounded(shallower)) : 1;
  const shallow = told
    ? density(bounded((shallower - shallowerPerShare * left) / EARLY_DEVIATION)) / EARLY_DEVIATION
    : 1;
  const there = 1 - shortShare;
  const full = there * (1 - earlyShare) * (density((value - expected) / deviation) / deviation) * usual;
  const short = shortShare * (cdf((expected - value) / deviation) / expected) * usual;
  const early = there * earlyShare * (cdf((EARLY_AT_MOST * expected - value) / deviation) / expected) * shallow;
  const all = full + short + early;
  into.short = all > 0 ? short / all : 0;
  into.early = all > 0 ? early / all : 0;
};
