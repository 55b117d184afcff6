import { requireFinite, requireWhole } from '../checked';
import { type Estimate, enough, tooFew } from '../estimate';
import { nelderMead } from '../nelder-mead';
import { classicalDecomposition } from '../season/classical-decomposition';
import { lineThrough } from './line';

type Form = 'additive' | 'multiplicative';
export type HoltWintersWeights = { alpha: number; beta: number; gamma: number };
/** Level, slope, and the season's indices in the order in which they come. */
export type HoltWintersState = { level: number; slope: number; season: number[] };
export type HoltWintersRun = {
  /** One step ahead from the second year on: the first gives the start. */
  fitted: number[];
  squaredErrors: number;
  end: HoltWintersState;
};

/** The season of the first two years, and the straight line through what they are without it. */
export const holtWintersStart = (values: readonly number[], period: number, form: Form): Estimate<HoltWintersState> => {
  const parts = classicalDecomposition(values.slice(0, 2 * period), period, form);
  if (!parts.enough) return parts;
  const { intercept, slope } = lineThrough(parts.value.trend.filter((level) => level !== null));
  return enough({ level: intercept, slope, season: parts.value.figures });
};

/**
 * The recursion of Winters (1960), Management Science 6, 324-342: l' = α(y − s) + (1 − α)(l + b), b' = β(l' − l) +
 * (1 − β)b, s' = γ(y − l') + (1 − γ)s; quotients instead of differences where the season multiplies.
 */
export const runHoltWinters = (
  values: readonly number[],
  form: Form,
  { alpha, beta, gamma }: HoltWintersWeights,
  start: HoltWintersState,
): HoltWintersRun => {
  const adds = form === 'additive';
  let { level, slope } = start;
  const season = [...start.season];
  let squaredErrors = 0;
  const fitted = values.slice(season.length).map((value, at) => {
    const phase = at % season.length;
    const index = season[phase] ?? 0;
    const expected = adds ? level + slope + index : (level + slope) * index;
    squaredErrors += (value - expected) ** 2;
    const next = alpha * (adds ? value - index : value / index) + (1 - alpha) * (level + slope);
    slope = beta * (next - level) + (1 - beta) * slope;
    level = next;
    season[phase] = gamma * (adds ? value - level : value / level) + (1 - gamma) * index;
    return expected;
  });
  const passed = fitted.length % season.length;
  return {
    fitted,
    squaredErrors,
    end: { level, slope, season: [...season.slice(passed), ...season.slice(0, passed)] },
  };
};

/** Points 1 to `horizon` steps after the end of a run. */
export const continueHoltWinters = (
  form: Form,
  { level, slope, season }: HoltWintersState,
  horizon: number,
): number[] =>
  Array.from({ length: horizon }, (_, step) => {
    const index = season[step % season.length] ?? 0;
    const trended = level + (step + 1) * slope;
    return form === 'additive' ? trended + index : trended * index;
  });

const share = (number = 0): number => 1 / (1 + Math.exp(-number));
const weightsAt = ([alpha, beta, gamma]: readonly number[]): HoltWintersWeights => ({
  alpha: share(alpha),
  beta: share(beta),
  gamma: share(gamma),
});
const STARTS = [
  [-1, -2, -1],
  [1, -4, 1],
  [0, -3, 3],
] as const;

/**
 * Holt-Winters with the weights of least squared one-step errors. Needs two full periods; a multiplying season throws a
 * RangeError where a value is not above 0.
 */
export const fitHoltWinters = (
  values: readonly number[],
  period: number,
  form: Form,
): Estimate<HoltWintersRun & { weights: HoltWintersWeights }> => {
  requireFinite(values, 'The values of the series');
  requireWhole(period, 'The period', 2);
  if (values.length < 2 * period) return tooFew(2 * period, values.length, 'values');
  const start = holtWintersStart(values, period, form);
  if (!start.enough) return start;
  const squares = (at: readonly number[]) => runHoltWinters(values, form, weightsAt(at), start.value).squaredErrors;
  const found = STARTS.map((at) => nelderMead(squares, at)).reduce((best, next) =>
    next.value < best.value ? next : best,
  );
  const weights = weightsAt(found.at);
  return enough({ ...runHoltWinters(values, form, weights, start.value), weights });
};
