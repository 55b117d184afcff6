import type { Stories } from './likelihood';
import type { ArrivalMixture, ArrivalShares } from './mixture';
import { PRIOR, type SeenPull } from './prior';
import { TOP_YIELD } from './shapes';

/** Nobody is taken never to stop early. */
const LEAST_SHARE = 0.004;

/** Who stops early how often, and the middling share; counted where a vacuum tells. */
export const stopsEarly = (pulls: readonly SeenPull[], stories: readonly Stories[]) => {
  const of: ArrivalMixture['stopsEarlyOf'] = {};
  pulls.forEach(({ technicianId, vacuum }, i) => {
    // Without a vacuum an early stop can't be told from a leak, so it teaches nothing about a person.
    if (!vacuum) return;
    const share = stories[i]?.stopped ?? 0;
    const known = of[technicianId] ?? { pulls: 0, stopped: 0 };
    of[technicianId] = { pulls: known.pulls + 1, stopped: known.stopped + share };
  });
  return { stopsEarlyOf: of, stopsEarly: middling(Object.values(of)) };
};

/** The share of the middling technician, weighted by pulls: one who often stops is no yardstick for the others. */
const middling = (crew: readonly { pulls: number; stopped: number }[]): number => {
  const { share, pulls } = PRIOR.stopsEarly;
  const people = [...crew.map((one) => ({ share: one.stopped / one.pulls, pulls: one.pulls })), { share, pulls }];
  let half = people.reduce((sum, one) => sum + one.pulls, 0) / 2;
  for (const one of people.sort((a, b) => a.share - b.share)) {
    half -= one.pulls;
    if (half <= 0) return Math.max(one.share, LEAST_SHARE);
  }
  return share;
};

/**
 * Units that came short against what the shares of the jobs lead to expect, drawn towards that. Without it somebody who
 * is sent to leaks would be taken for one who stops early.
 */
export const meetsShort = (
  pulls: readonly SeenPull[],
  stories: readonly Stories[],
  shares: Record<string, ArrivalShares>,
): Record<string, number> => {
  const { pulls: drawn } = PRIOR.meetsShort;
  const of = new Map<string, { met: number; expected: number }>();
  pulls.forEach(({ technicianId, job }, i) => {
    const known = of.get(technicianId) ?? { met: drawn, expected: drawn };
    const story = stories[i];
    const usual = shares[job] ?? shares.all;
    if (!story || !usual) return;
    of.set(technicianId, {
      met: known.met + story.short + story.empty,
      expected: known.expected + (1 - story.stopped) * (usual.leaked + usual.empty),
    });
  });
  return Object.fromEntries([...of].map(([id, { met, expected }]) => [id, met / expected]));
};

/** Thorough pulls of each technician against the crew's of the same kind, drawn towards them. */
export const leaves = (pulls: readonly SeenPull[], sound: readonly number[], mean: Record<string, number>) => {
  const { pulls: drawn } = PRIOR.leaves;
  const of = new Map<string, { left: number; weight: number }>();
  pulls.forEach(({ technicianId, kind, recoveryYield }, i) => {
    const known = of.get(technicianId) ?? { left: drawn, weight: drawn };
    const usual = TOP_YIELD - (mean[kind] ?? mean.all ?? PRIOR.sound.mean);
    const weight = sound[i] ?? 0;
    of.set(technicianId, {
      left: known.left + (weight * (TOP_YIELD - recoveryYield)) / usual,
      weight: known.weight + weight,
    });
  });
  return Object.fromEntries([...of].map(([id, { left, weight }]) => [id, left / weight]));
};
