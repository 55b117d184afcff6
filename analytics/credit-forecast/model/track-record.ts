import { type Choice, chooseMethod } from './choice';
import { expectedMass } from './expected';
import { historyUntil, largeKg, type MassHistory } from './history';
import { drawnFor, drawnTotal, drawPaths } from './paths';
import { rangeOf, reachOf } from './ranges';

const FIRST_ORIGIN = 36;
const ORIGINS = 36;
const HORIZON = 12;
const PATHS = 300;
/** The range that past forecasts are counted in for a reader. */
const TOLD_LEVEL = 0.8;

/**
 * What past forecasts were worth, to be kept until the records change: it takes seconds to make. `reach` is the share of
 * the drawn paths that a range had to hold to reach what came.
 */
export type TrackRecord = {
  choice: Choice;
  /** Of all refrigerants together, a list for each month ahead. */
  totalReach: number[][];
  /** Of single refrigerants, all months ahead together. */
  refrigerantReach: number[];
  /** Forecasts of the next month made from each origin: how many, and how many lay inside their uncalibrated range. */
  told: { level: number; forecasts: number; inside: number };
};

const actualKg = (history: MassHistory, refrigerant: string): number[] => {
  const routine = history.routineKg.get(refrigerant);
  return largeKg(history, refrigerant).map((mass, at) => mass + (routine?.[at] ?? 0));
};

/**
 * Makes the forecast again from every month of the last three years, from nothing but what was known then, and sees where
 * what came lay among its paths. Empty lists before there are 36 months.
 */
export const trackRecord = (history: MassHistory, seed: string): TrackRecord => {
  const choice = chooseMethod(history);
  const record: TrackRecord = {
    choice,
    totalReach: Array.from({ length: HORIZON }, () => []),
    refrigerantReach: [],
    told: { level: TOLD_LEVEL, forecasts: 0, inside: 0 },
  };
  const actual = new Map<string, number[]>();
  for (let known = Math.max(FIRST_ORIGIN, history.months - ORIGINS); known < history.months; known++) {
    const past = historyUntil(history, known);
    const horizon = Math.min(HORIZON, history.months - known);
    const expected = expectedMass(past, choice.method, horizon);
    const paths = drawPaths(past, expected, PATHS, `${seed}/${known}`);
    for (let step = 0; step < horizon; step++) {
      const at = known + step;
      if (history.lost.has(at)) continue;
      let totalKg = 0;
      paths.refrigerants.forEach((refrigerant, row) => {
        const masses = actual.get(refrigerant) ?? actualKg(history, refrigerant);
        actual.set(refrigerant, masses);
        totalKg += masses[at] ?? 0;
        const drawn = drawnFor(paths, row, step);
        const reach = reachOf(drawn, masses[at] ?? 0);
        if (reach !== null) record.refrigerantReach.push(reach);
      });
      const drawn = drawnTotal(paths, step);
      const reach = reachOf(drawn, totalKg);
      if (reach !== null) record.totalReach[step]?.push(reach);
      if (step > 0) continue;
      const { lowerKg, upperKg } = rangeOf(drawn, TOLD_LEVEL);
      record.told.forecasts += 1;
      if (totalKg >= lowerKg && totalKg <= upperKg) record.told.inside += 1;
    }
  }
  return record;
};
