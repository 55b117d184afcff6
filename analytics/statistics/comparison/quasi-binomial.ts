import { inverse, Matrix, QrDecomposition } from 'ml-matrix';
import { requireFinite, requirePositive, requireSameLength } from '../checked';
import { type Estimate, enough, tooFew } from '../estimate';

export type QuasiBinomial = {
  coefficients: number[];
  standardErrors: number[];
  /** How many times more the shares vary than binomial ones would, from Pearson residuals. */
  dispersion: number;
  deviance: number;
  fitted: number[];
  /** False where some shares are told apart perfectly: coefficients then run away and mean nothing. */
  converged: boolean;
};

const MOST_STEPS = 100;
const logistic = (value: number): number => 1 / (1 + Math.exp(-value));
const entropy = (part: number, expected: number): number => (part > 0 ? part * Math.log(part / expected) : 0);

const devianceOf = (hits: readonly number[], sizes: readonly number[], fitted: readonly number[]): number =>
  hits.reduce((sum, count, index) => {
    const [size, share] = [sizes[index] ?? 0, fitted[index] ?? 0];
    return sum + 2 * (entropy(count, size * share) + entropy(size - count, size * (1 - share)));
  }, 0);

const check = (design: readonly number[][], hits: readonly number[], sizes: readonly number[]): void => {
  requireSameLength(hits, sizes, 'Hits and sizes');
  requireSameLength(design, hits, 'Rows of the design and hits');
  requireFinite(design.flat(), 'The design');
  hits.forEach((count, index) => {
    const size = sizes[index] ?? 0;
    requirePositive(size, 'A size');
    if (!(count >= 0 && count <= size)) throw new RangeError(`Hits must lie between 0 and ${size}, not ${count}`);
  });
};

/**
 * Logistic regression of shares whose spread is estimated, by iteratively reweighted least squares. `design` has one row
 * a share, with a column of ones for the intercept; throws a RangeError where its columns depend on each other. Hits may
 * be fractions. Needs a share more than there are columns. McCullagh & Nelder, Generalized Linear Models, 2nd ed. (1989),
 * 2.5 and 4.5.
 */
export const quasiBinomial = (
  design: readonly number[][],
  hits: readonly number[],
  sizes: readonly number[],
): Estimate<QuasiBinomial> => {
  check(design, hits, sizes);
  const columns = design[0]?.length ?? 0;
  if (design.length <= columns) return tooFew(columns + 1, design.length, 'shares');

  const predictors = new Matrix(design.map((row) => [...row]));
  if (!new QrDecomposition(predictors).isFullRank()) throw new RangeError('Columns of the design depend on each other');
  let fitted = hits.map((count, index) => (count + 0.5) / ((sizes[index] ?? 0) + 1));
  let linear = fitted.map((share) => Math.log(share / (1 - share)));
  let coefficients: number[] = [];
  let deviance = devianceOf(hits, sizes, fitted);
  let converged = false;
  let weighted = predictors;
  for (let step = 0; step < MOST_STEPS && !converged; step++) {
    const curvature = fitted.map((share) => share * (1 - share));
    const roots = curvature.map((slope, index) => Math.sqrt((sizes[index] ?? 0) * slope));
    const working = linear.map((value, index) => {
      const residual = (hits[index] ?? 0) / (sizes[index] ?? 1) - (fitted[index] ?? 0);
      return (value + residual / (curvature[index] ?? 1)) * (roots[index] ?? 0);
    });
    const rows = Matrix.diag(roots).mmul(predictors);
    const decomposition = new QrDecomposition(rows);
    if (!decomposition.isFullRank()) break;
    weighted = rows;
    const solved = decomposition.solve(Matrix.columnVector(working));
    coefficients = solved.to1DArray();
    linear = predictors.mmul(solved).to1DArray();
    fitted = linear.map(logistic);
    const next = devianceOf(hits, sizes, fitted);
    converged = Math.abs(next - deviance) <= 1e-13 * (Math.abs(next) + 0.1);
    deviance = next;
  }

  const pearson = fitted.reduce((sum, share, index) => {
    const [size, count] = [sizes[index] ?? 0, hits[index] ?? 0];
    return sum + (count - size * share) ** 2 / (size * share * (1 - share));
  }, 0);
  const dispersion = pearson / (design.length - columns);
  const covariance = inverse(weighted.transpose().mmul(weighted));
  const standardErrors = covariance.diagonal().map((variance) => Math.sqrt(dispersion * variance));
  return enough({ coefficients, standardErrors, dispersion, deviance, fitted, converged });
};
