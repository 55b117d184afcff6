import { sum } from 'simple-statistics';
import type { Columns } from './columns';
import type { JobChances } from './job-chances';
import { ShortShares } from './short-shares';
import type { StartingPoint } from './starting-point';
import { SumsWithout } from './sums-without';
import { vacuumSlopes } from './vacuum-slopes';

/** Weight of colleagues' full pulls of a kind from which on a job is compared at all. */
const LEAST_OTHERS = 8;
const PRIOR_YIELDS = 5;
const PRIOR_SPREAD = 20;
/** Jobs at the crew's level that a technician's own level is mixed with. */
const PRIOR_OWN = 2;
export const FIRST_DEVIATION = 0.06;
export const LEAST_DEVIATION = 0.01;
/** Shares to begin with: units that come short, and pulls that are stopped early; and the least of the latter. */
export const FIRST_SHORT = 0.25;
export const FIRST_EARLY = 0.02;
const LEAST_EARLY = 0.002;
/** Jobs' worth by which a technician's own share of early stops is tied to the crew's. */
const PRIOR_EARLY = 250;

/** What the search goes on with from round to round. */
export type Standards = {
  /** Colleagues' full yield and vacuum, by kind and technician. */
  yields: Float64Array;
  vacuums: Float64Array;
  yieldDeviations: Float64Array;
  vacuumDeviations: readonly number[];
  /** Each technician's own level about them. */
  ownYield: Float64Array;
  ownVacuum: Float64Array;
  shortShares: Float64Array;
  earlyShares: Float64Array;
};

export const firstStandards = (columns: Columns, start: StartingPoint): Standards => {
  const people = columns.technicians.length;
  const spreadOut = (groups: number, values: readonly number[]) =>
    Float64Array.from({ length: groups * people }, (_, place) => values[Math.floor(place / people)] ?? Number.NaN);
  return {
    yields: spreadOut(columns.kinds, start.yields),
    vacuums: spreadOut(columns.vacuumKinds, start.vacuums),
    yieldDeviations: new Float64Array(columns.kinds).fill(FIRST_DEVIATION),
    vacuumDeviations: start.vacuumDeviations,
    ownYield: new Float64Array(people),
    ownVacuum: new Float64Array(people),
    shortShares: new Float64Array(columns.cells).fill(FIRST_SHORT),
    earlyShares: new Float64Array(people).fill(FIRST_EARLY),
  };
};

/** Maximisation, first half: what colleagues give and how often what happens, from the jobs that count. */
export const renewStandards = (columns: Columns, standards: Standards, out: JobChances, counts: Uint8Array): void => {
  const people = columns.technicians.length;
  const full = new SumsWithout(columns.kinds, people);
  const vacuum = new SumsWithout(columns.vacuumKinds, people);
  const shortShares = new ShortShares(columns);
  const [early, jobs] = [new Float64Array(people), new Float64Array(people)];
  for (let at = 0; at < columns.count; at++) {
    if (!counts[at]) continue;
    const person = columns.technician[at] ?? 0;
    const shortChance = out.short[at] ?? 0;
    const earlyChance = out.early[at] ?? 0;
    full.add(columns.kind[at] ?? 0, person, 1 - shortChance - earlyChance, columns.yields[at] ?? 0);
    if (!Number.isNaN(out.shallower[at] ?? Number.NaN))
      vacuum.add(columns.vacuumKind[at] ?? 0, person, 1 - earlyChance, columns.vacuums[at] ?? 0);
    shortShares.add(at, shortChance);
    early[person] = (early[person] ?? 0) + earlyChance;
    jobs[person] = (jobs[person] ?? 0) + 1 - shortChance;
  }
  out.slopes = vacuumSlopes(columns, out, counts);
  standards.shortShares = shortShares.shares(FIRST_SHORT);
  const overall = Math.max(LEAST_EARLY, sum([...early]) / Math.max(1, sum([...jobs])));
  standards.earlyShares = early.map(
    (own, person) => (own + PRIOR_EARLY * overall) / ((jobs[person] ?? 0) + PRIOR_EARLY),
  );
  for (let person = 0; person < people; person++) {
    for (let kind = 0; kind < columns.kinds; kind++)
      if (full.weightOfOthers(kind, person) > 0)
        standards.yields[kind * people + person] = full.expected(kind, person, PRIOR_YIELDS);
    for (let kind = 0; kind < columns.vacuumKinds; kind++)
      if (vacuum.weightOfOthers(kind, person) > 0)
        standards.vacuums[kind * people + person] = vacuum.expected(kind, person, 0);
  }
  for (let at = 0; at < columns.count; at++) {
    const person = columns.technician[at] ?? 0;
    out.comparable[at] = Number(full.weightOfOthers(columns.kind[at] ?? 0, person) >= LEAST_OTHERS);
    if (vacuum.weightOfOthers(columns.vacuumKind[at] ?? 0, person) < LEAST_OTHERS) out.shallower[at] = Number.NaN;
  }
};

/** Maximisation, second half: each technician's own level, and how far full pulls lie about it. */
export const renewLevels = (columns: Columns, standards: Standards, out: JobChances, counts: Uint8Array): void => {
  const people = columns.technicians.length;
  const [yieldSum, yieldWeight] = [new Float64Array(people), new Float64Array(people).fill(PRIOR_OWN)];
  const [vacuumSum, vacuumWeight] = [new Float64Array(people), new Float64Array(people).fill(PRIOR_OWN)];
  const differenceAt = (at: number, person: number): number =>
    (columns.yields[at] ?? 0) - (standards.yields[(columns.kind[at] ?? 0) * people + person] ?? 0);
  for (let at = 0; at < columns.count; at++) {
    if (!counts[at] || !out.comparable[at]) continue;
    const person = columns.technician[at] ?? 0;
    const shortChance = out.short[at] ?? 0;
    const earlyChance = out.early[at] ?? 0;
    const weight = 1 - shortChance - earlyChance;
    yieldSum[person] = (yieldSum[person] ?? 0) + weight * differenceAt(at, person);
    yieldWeight[person] = (yieldWeight[person] ?? 0) + weight;
    const shallower = out.shallower[at] ?? Number.NaN;
    if (Number.isNaN(shallower)) continue;
    vacuumSum[person] = (vacuumSum[person] ?? 0) + (1 - earlyChance) * shallower;
    vacuumWeight[person] = (vacuumWeight[person] ?? 0) + 1 - earlyChance;
  }
  standards.ownYield = yieldSum.map((sum, person) => sum / (yieldWeight[person] ?? 1));
  standards.ownVacuum = vacuumSum.map((sum, person) => sum / (vacuumWeight[person] ?? 1));

  const [squares, weights] = [new Float64Array(columns.kinds), new Float64Array(columns.kinds)];
  let [allSquares, allWeights] = [0, 0];
  for (let at = 0; at < columns.count; at++) {
    if (!counts[at]) continue;
    const kind = columns.kind[at] ?? 0;
    const person = columns.technician[at] ?? 0;
    const weight = 1 - (out.short[at] ?? 0) - (out.early[at] ?? 0);
    const square = weight * (differenceAt(at, person) - (standards.ownYield[person] ?? 0)) ** 2;
    squares[kind] = (squares[kind] ?? 0) + square;
    weights[kind] = (weights[kind] ?? 0) + weight;
    allSquares += square;
    allWeights += weight;
  }
  const pooled = allWeights > 0 ? allSquares / allWeights : FIRST_DEVIATION ** 2;
  standards.yieldDeviations = squares.map((sum, kind) => {
    const variance = (sum + PRIOR_SPREAD * pooled) / ((weights[kind] ?? 0) + PRIOR_SPREAD);
    return Math.max(LEAST_DEVIATION, Math.sqrt(variance));
  });
};
