import { Matrix, QrDecomposition } from 'ml-matrix';
import { requireFinite } from '../checked';

/** Whether no column is a mix of the others, but for rounding. */
export const hasFullRank = (decomposition: QrDecomposition): boolean => {
  const pivots = decomposition.upperTriangularMatrix.diagonal().map(Math.abs);
  return Math.min(...pivots) > 1e-10 * Math.max(...pivots);
};

/** The rows as a matrix; throws a RangeError where a figure is no number or columns depend on each other. */
export const requireDesign = (rows: readonly number[][]): Matrix => {
  requireFinite(rows.flat(), 'The design');
  const design = new Matrix(rows.map((row) => [...row]));
  if (!hasFullRank(new QrDecomposition(design))) throw new RangeError('Columns of the design depend on each other');
  return design;
};
