import { determinant, inverse, Matrix } from 'ml-matrix';
import { requireFinite, requireSameLength } from '../checked';
import { type Estimate, enough, tooFew } from '../estimate';
import { groupBy } from '../group-by';
import { minimise } from '../minimise';
import { requireDesign } from './design';

export type RandomIntercept = {
  coefficients: number[];
  standardErrors: number[];
  groupVariance: number;
  residualVariance: number;
  restrictedCriterion: number;
  /** Each group's own level against the others, drawn towards 0, with the error that is left in it. */
  groups: { name: string; level: number; conditionalError: number }[];
};

type Group = { rows: number[]; name: string };

const groupsOf = (names: readonly string[]): Group[] =>
  [...groupBy([...names.keys()], (row) => names[row] ?? '')].map(([name, rows]) => ({ name, rows }));

const total = (rows: readonly number[], values: readonly number[]): number =>
  rows.reduce((sum, row) => sum + (values[row] ?? 0), 0);

/** Generalised least squares for one ratio of the group variance to the residual one. */
const fitAt = (ratio: number, values: readonly number[], predictors: Matrix, groups: readonly Group[]) => {
  const columns = predictors.transpose().to2DArray();
  const pull = ({ rows }: Group) => ratio / (1 + ratio * rows.length);
  const product = (left: readonly number[], right: readonly number[]) =>
    left.reduce((sum, value, row) => sum + value * (right[row] ?? 0), 0) -
    groups.reduce((sum, group) => sum + pull(group) * total(group.rows, left) * total(group.rows, right), 0);
  const information = new Matrix(columns.map((left) => columns.map((right) => product(left, right))));
  const moments = Matrix.columnVector(columns.map((column) => product(column, values)));
  const covariance = inverse(information);
  const solved = covariance.mmul(moments);
  const predicted = predictors.mmul(solved).to1DArray();
  const residuals = values.map((value, row) => value - (predicted[row] ?? 0));
  const freedom = values.length - columns.length;
  const residualVariance = product(residuals, residuals) / freedom;
  const restrictedCriterion =
    freedom * (1 + Math.log(2 * Math.PI * residualVariance)) +
    groups.reduce((sum, { rows }) => sum + Math.log1p(ratio * rows.length), 0) +
    Math.log(determinant(information));
  const levels = groups.map((group) => ({
    name: group.name,
    level: pull(group) * total(group.rows, residuals),
    conditionalError: Math.sqrt(residualVariance * pull(group)),
  }));
  return { coefficients: solved.to1DArray(), covariance, residualVariance, restrictedCriterion, levels };
};

/**
 * Regression with a level for each group, by restricted maximum likelihood. `design` has one row a value, with a column
 * of ones. A group variance of 0 is a real answer. Needs two groups and a value more than columns and groups. Laird &
 * Ware (1982), Biometrics 38, 963-974.
 */
export const randomIntercept = (
  values: readonly number[],
  names: readonly string[],
  design: readonly number[][],
): Estimate<RandomIntercept> => {
  requireFinite(values, 'Values');
  requireSameLength(values, names, 'Values and groups');
  requireSameLength(values, design, 'Values and rows of the design');
  const groups = groupsOf(names);
  if (groups.length < 2) return tooFew(2, groups.length, 'groups');
  const least = (design[0]?.length ?? 0) + groups.length + 1;
  if (values.length < least) return tooFew(least, values.length, 'values');

  const predictors = requireDesign(design);
  const at = (ratio: number) => fitAt(ratio, values, predictors, groups);
  const best = minimise((logRatio) => at(Math.exp(logRatio)).restrictedCriterion, -20, 20);
  const ratio = at(0).restrictedCriterion <= best.value ? 0 : Math.exp(best.at);
  const fit = at(ratio);
  return enough({
    coefficients: fit.coefficients,
    standardErrors: fit.covariance.diagonal().map((variance) => Math.sqrt(fit.residualVariance * variance)),
    groupVariance: ratio * fit.residualVariance,
    residualVariance: fit.residualVariance,
    restrictedCriterion: fit.restrictedCriterion,
    groups: fit.levels,
  });
};
