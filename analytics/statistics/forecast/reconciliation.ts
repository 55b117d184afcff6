import { Matrix, solve } from 'ml-matrix';
import { requireFinite } from '../checked';

/**
 * How series add up: one row a series, one column a part (a bottom series), 1 where the series contains the part. The
 * parts themselves are the last rows.
 */
export type Summing = readonly (readonly number[])[];

/** Square weights of the base forecasts' errors: see `reconcile`. */
export type ErrorWeights = Matrix;

/**
 * Forecasts that add up, as near to the base forecasts as their errors allow: S(S'W⁻¹S)⁻¹S'W⁻¹ŷ, with W the covariance
 * of the base forecasts' errors or a stand-in for it. Wickramasuriya, Athanasopoulos & Hyndman (2019), Journal of the
 * American Statistical Association 114, 804-819, theorem 1.
 */
export const reconcile = (summing: Summing, base: readonly number[], weights: ErrorWeights): number[] => {
  requireFinite(base, 'Base forecasts');
  const sums = new Matrix(summing.map((row) => [...row]));
  const weighted = solve(weights, sums);
  const parts = solve(weighted.transpose().mmul(sums), weighted.transpose().mmul(Matrix.columnVector([...base])));
  return sums.mmul(parts).to1DArray();
};

/** The parts as they were forecast, and their sums. */
export const bottomUp = (summing: Summing, base: readonly number[]): number[] => {
  const parts = base.slice(base.length - (summing[0]?.length ?? 0));
  return summing.map((row) => row.reduce((sum, holds, part) => sum + holds * (parts[part] ?? 0), 0));
};

/** OLS: every series counts alike. */
export const equalWeights = (summing: Summing): ErrorWeights => Matrix.eye(summing.length);

/** WLS by structure: a series' error grows with the parts it holds. */
export const structuralWeights = (summing: Summing): ErrorWeights =>
  Matrix.diag(summing.map((row) => row.reduce((sum, holds) => sum + holds, 0)));

/** Second moments of errors, one row an origin, one column a series. No centring: forecasts should have no bias. */
const secondMoments = (errors: Matrix): Matrix => errors.transpose().mmul(errors).div(errors.rows);

/** WLS by variance: each series by the mean square of its past errors. */
export const varianceWeights = (errors: readonly (readonly number[])[]): ErrorWeights =>
  Matrix.diag(secondMoments(new Matrix(errors.map((row) => [...row]))).diagonal());

/**
 * MinT: the errors' covariance, shrunk towards its diagonal by as much as its correlations are uncertain. Schäfer &
 * Strimmer (2005), Statistical Applications in Genetics and Molecular Biology 4, 32.
 */
export const shrunkWeights = (errors: readonly (readonly number[])[]): { weights: ErrorWeights; shrinkage: number } => {
  const matrix = new Matrix(errors.map((row) => [...row]));
  const moments = secondMoments(matrix);
  const scales = moments.diagonal().map(Math.sqrt);
  const scaled = Matrix.zeros(matrix.rows, matrix.columns);
  for (let row = 0; row < matrix.rows; row++) {
    for (let column = 0; column < matrix.columns; column++) {
      scaled.set(row, column, matrix.get(row, column) / (scales[column] || 1));
    }
  }
  const correlations = secondMoments(scaled);
  const { rows: origins, columns: series } = matrix;
  const squared = scaled.clone().pow(2);
  const products = squared.transpose().mmul(squared);
  let [uncertain, correlated] = [0, 0];
  for (let a = 0; a < series; a++) {
    for (let b = 0; b < series; b++) {
      if (a === b) continue;
      const correlation = correlations.get(a, b);
      uncertain += (products.get(a, b) - origins * correlation ** 2) / (origins * (origins - 1));
      correlated += correlation ** 2;
    }
  }
  const shrinkage = correlated > 0 ? Math.max(0, Math.min(1, uncertain / correlated)) : 1;
  const diagonal = Matrix.diag(moments.diagonal()).mul(shrinkage);
  return { weights: moments.mul(1 - shrinkage).add(diagonal), shrinkage };
};
