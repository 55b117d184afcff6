import { inverse, Matrix, QrDecomposition } from 'ml-matrix';
import { requirePositive, requireSameLength } from '../checked';
import { type Estimate, enough, tooFew } from '../estimate';
import { hasFullRank, requireDesign } from './design';

/** A share as it counts: hits (fractions too) among `size`. */
type Share = { hits: number; size: number };

export type QuasiBinomial =
  /** Some shares are told apart perfectly: coefficients run away and mean nothing. */
  | { converged: false }
  | {
      converged: true;
      coefficients: number[];
      standardErrors: number[];
      /** How many times more the shares vary than binomial ones would, from Pearson residuals. */
      dispersion: number;
      deviance: number;
      fitted: number[];
    };

const MOST_STEPS = 100;
const RUNAWAY = 1e-8;

const logistic = (value: number): number => 1 / (1 + Math.exp(-value));
const entropy = (part: number, expected: number): number => (part > 0 ? part * Math.log(part / expected) : 0);
const total = (
  shares: readonly Share[],
  fitted: readonly number[],
  of: (share: Share, fit: number) => number,
): number => shares.reduce((sum, share, index) => sum + of(share, fitted[index] ?? 0), 0);

const deviance = ({ hits, size }: Share, fit: number): number =>
  2 * (entropy(hits, size * fit) + entropy(size - hits, size * (1 - fit)));
const pearson = ({ hits, size }: Share, fit: number): number => (hits - size * fit) ** 2 / (size * fit * (1 - fit));

/** One weighted least-squares step from the linear predictor; null where the weights leave nothing to solve. */
const step = (design: Matrix, shares: readonly Share[], linear: readonly number[]) => {
  const roots: number[] = [];
  const working = shares.map(({ hits, size }, index) => {
    const at = linear[index] ?? 0;
    const fit = logistic(at);
    const curvature = fit * (1 - fit);
    const root = Math.sqrt(size * curvature);
    roots.push(root);
    return root * (at + (hits / size - fit) / curvature);
  });
  const weighted = new Matrix(design.to2DArray().map((row, index) => row.map((value) => value * (roots[index] ?? 0))));
  const decomposition = new QrDecomposition(weighted);
  if (!hasFullRank(decomposition)) return null;
  const solved = decomposition.solve(Matrix.columnVector(working));
  const next = design.mmul(solved).to1DArray();
  return { coefficients: solved.to1DArray(), linear: next, fitted: next.map(logistic), weighted };
};

/**
 * Logistic regression of shares whose spread is estimated, by iteratively reweighted least squares. `rows` has one row a
 * share, with a column of ones for the intercept; throws a RangeError where its columns depend on each other. Needs a
 * share more than there are columns. McCullagh & Nelder, Generalized Linear Models, 2nd ed. (1989), 2.5 and 4.5.
 */
export const quasiBinomial = (
  rows: readonly number[][],
  hits: readonly number[],
  sizes: readonly number[],
): Estimate<QuasiBinomial> => {
  requireSameLength(hits, sizes, 'Hits and sizes');
  requireSameLength(rows, hits, 'Rows of the design and hits');
  const shares = hits.map((count, index) => ({ hits: count, size: sizes[index] ?? 0 }));
  for (const share of shares) {
    requirePositive(share.size, 'A size');
    if (!(share.hits >= 0 && share.hits <= share.size)) {
      throw new RangeError(`Hits must lie between 0 and ${share.size}, not ${share.hits}`);
    }
  }
  const columns = rows[0]?.length ?? 0;
  if (rows.length <= columns) return tooFew(columns + 1, rows.length, 'shares');

  const design = requireDesign(rows);
  let linear = shares.map((share) => Math.log((share.hits + 0.5) / (share.size - share.hits + 0.5)));
  let before = total(shares, linear.map(logistic), deviance);
  for (let taken = 0; taken < MOST_STEPS; taken++) {
    const found = step(design, shares, linear);
    if (!found || found.fitted.some((fit) => fit < RUNAWAY || fit > 1 - RUNAWAY)) break;
    const { coefficients, fitted, weighted } = found;
    const now = total(shares, fitted, deviance);
    if (Math.abs(now - before) <= 1e-13 * (now + 0.1)) {
      const dispersion = total(shares, fitted, pearson) / (rows.length - columns);
      const variances = inverse(weighted.transpose().mmul(weighted)).diagonal();
      const standardErrors = variances.map((variance) => Math.sqrt(dispersion * variance));
      return enough({ converged: true, coefficients, standardErrors, dispersion, deviance: now, fitted });
    }
    linear = found.linear;
    before = now;
  }
  return enough({ converged: false });
};
