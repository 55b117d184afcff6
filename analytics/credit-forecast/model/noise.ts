import type { Expected } from './expected';
import { type MassHistory, monthOfYear, routineTotals } from './history';
import { sharesAhead } from './mix';

/** Months that the spread of routine masses is learnt from. */
const WINDOW = 48;
/** A company's volume moves by at least this much from month to month, relative. */
const LEAST_NOISE = 0.05;
const SMOOTHING = 0.25;

export type RoutineNoise = {
  /** Relative standard deviation of a month's volume beyond what its portions explain. */
  monthly: number;
  /** How much of a month's surprise stays in the level. */
  persistence: number;
  /** Relative standard error of the level itself. */
  level: number;
};

/**
 * How routine volume moves: one-step surprises about a smoothed level, less what a sum of single portions varies by
 * anyway.
 */
export const routineNoise = (history: MassHistory, { routine, trends }: Expected): RoutineNoise => {
  const totals = routineTotals(history);
  const { season, masses } = routine;
  let level = masses[0] ?? 0;
  const surprises: { at: number; relative: number }[] = [];
  masses.forEach((mass, at) => {
    if (level > 0 && totals[at] !== null) surprises.push({ at, relative: mass / level - 1 });
    level += SMOOTHING * (mass - level);
  });
  const last = surprises.slice(-WINDOW);
  const square = last.reduce((sum, { relative }) => sum + relative ** 2, 0) / Math.max(1, last.length);
  // Surprises about a level that is itself smoothed from surprises are larger by this.
  const own = square * (1 - SMOOTHING / 2);
  const shares = sharesAhead(trends, 0);
  const portion = trends.reduce((sum, { portionKg }, at) => sum + portionKg * (shares[at] ?? 0), 0);
  const recent = last.map(({ at }) => (masses[at] ?? 0) * (season[monthOfYear(history, at)] ?? 1));
  const usual = recent.reduce((sum, mass) => sum + mass, 0) / Math.max(1, recent.length);
  const ofPortions = usual > 0 ? portion / usual : 0;
  const monthly = Math.sqrt(Math.max(LEAST_NOISE ** 2, own - ofPortions));
  return { monthly, persistence: 0.1, level: Math.sqrt((monthly ** 2 + ofPortions) / 12) };
};
