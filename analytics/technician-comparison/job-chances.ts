import { type Columns, KNOWN_EARLY, KNOWN_SHORT } from './columns';
import { type Chances, type Seen, weigh } from './likelihoods';
import {
  FIRST_DEVIATION,
  FIRST_EARLY,
  FIRST_SHORT,
  firstStandards,
  LEAST_DEVIATION,
  renewLevels,
  renewStandards,
  type Standards,
} from './standards';
import type { StartingPoint } from './starting-point';
import { firstSlopes } from './vacuum-slopes';

/** What a job looks like, from its yield and its final vacuum, and what colleagues would have given. */
export type JobChances = {
  /** Chance that the unit came short of its full charge, and that the pull was stopped early; the rest is a full pull. */
  short: Float64Array;
  early: Float64Array;
  /** Yield of colleagues' full pulls of the kind, and the usual distance of one from it. */
  fullYield: Float64Array;
  yieldDeviation: Float64Array;
  /** How much shallower than colleagues' the vacuum was, in kPa and in usual deviations; NaN where that can't be told. */
  shallowerKpa: Float64Array;
  shallower: Float64Array;
  /** By vacuum kind, how much shallower it gets for each share of the charge that is left, in usual deviations. */
  slopes: Float64Array;
  /** 1 where enough colleagues did the kind to compare with. */
  comparable: Uint8Array;
};

const ROUNDS = 9;

/** Expectation: each job's chances under the standards. */
const weighJobs = (columns: Columns, standards: Standards, out: JobChances): void => {
  const people = columns.technicians.length;
  const seen: Seen = {
    value: 0,
    expected: 1,
    deviation: 1,
    shallower: 0,
    shallowerPerShare: 0,
    shortShare: 0,
    earlyShare: 0,
  };
  const chances: Chances = { short: 0, early: 0 };
  for (let at = 0; at < columns.count; at++) {
    const kind = columns.kind[at] ?? 0;
    const person = columns.technician[at] ?? 0;
    const vacuumKind = columns.vacuumKind[at] ?? 0;
    const full = standards.yields[kind * people + person] ?? 1;
    const usual = standards.vacuumDeviations[vacuumKind] ?? 0;
    const kpa = (columns.vacuums[at] ?? 0) - (standards.vacuums[vacuumKind * people + person] ?? 0);
    const shallower = usual > 0 ? kpa / usual : Number.NaN;
    out.fullYield[at] = full;
    out.yieldDeviation[at] = standards.yieldDeviations[kind] ?? FIRST_DEVIATION;
    out.shallowerKpa[at] = usual > 0 ? kpa : Number.NaN;
    out.shallower[at] = shallower;
    const known = columns.decided[at];
    if (known === KNOWN_SHORT || known === KNOWN_EARLY) {
      out.short[at] = known === KNOWN_SHORT ? 1 : 0;
      out.early[at] = known === KNOWN_EARLY ? 1 : 0;
      continue;
    }
    seen.value = columns.yields[at] ?? 0;
    seen.expected = Math.max(LEAST_DEVIATION, full + (standards.ownYield[person] ?? 0));
    seen.deviation = out.yieldDeviation[at] ?? FIRST_DEVIATION;
    seen.shallower = shallower - (standards.ownVacuum[person] ?? 0);
    seen.shallowerPerShare = out.slopes[vacuumKind] ?? 0;
    seen.shortShare = standards.shortShares[columns.cell[at] ?? 0] ?? FIRST_SHORT;
    seen.earlyShare = standards.earlyShares[person] ?? FIRST_EARLY;
    weigh(seen, chances);
    out.short[at] = chances.short;
    out.early[at] = chances.early;
  }
};

/**
 * Mixture of full pulls, short units and early stops, fitted by expectation and maximisation (Dempster, Laird & Rubin
 * 1977, JRSS B 39, 1-38). Each technician's own level is allowed for, so that one who always pulls a little less is not
 * taken for one whose units leak. A job that does not count (0 in `counts`) is weighed but sets no standard.
 */
export const jobChances = (columns: Columns, start: StartingPoint, counts: Uint8Array): JobChances => {
  const { count } = columns;
  const out: JobChances = {
    short: new Float64Array(count),
    early: new Float64Array(count),
    fullYield: new Float64Array(count),
    yieldDeviation: new Float64Array(count),
    shallowerKpa: new Float64Array(count),
    shallower: new Float64Array(count),
    slopes: firstSlopes(columns.vacuumKinds),
    comparable: new Uint8Array(count),
  };
  const standards = firstStandards(columns, start);
  for (let round = 0; round < ROUNDS; round++) {
    weighJobs(columns, standards, out);
    renewStandards(columns, standards, out, counts);
    renewLevels(columns, standards, out, counts);
  }
  return out;
};
