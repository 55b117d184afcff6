import { Matrix } from 'ml-matrix';
import type { Ahead } from './ahead';
import type { EtsFit } from './fit';

const product = (a: Matrix, b: Matrix): Matrix => a.kroneckerProduct(b);

/** The columns of a matrix under each other. */
const stacked = (matrix: Matrix): Matrix => Matrix.columnVector(matrix.transpose().to1DArray());

/**
 * Exact means and variances of a model whose error and season multiply: the state is the product of (level, slope) and
 * the season's indices, of which the first two moments are carried along. Hyndman, Koehler, Ord & Snyder (2008),
 * Forecasting with Exponential Smoothing, section 6.4.
 */
export const productMoments = ({ model, weights, run, variance }: EtsFit, horizon: number): Ahead[] => {
  const { alpha, beta, gamma, phi } = weights;
  const { period } = model;
  const trended = model.trend === 'A';
  const observeLevel = new Matrix([trended ? [1, phi] : [1]]);
  const observeSeason = Matrix.zeros(1, period).set(0, period - 1, 1);
  const moveLevel = new Matrix(
    trended
      ? [
          [1, phi],
          [0, phi],
        ]
      : [[1]],
  );
  const learnLevel = new Matrix(
    trended
      ? [
          [alpha, alpha * phi],
          [beta, beta * phi],
        ]
      : [[alpha]],
  );
  const moveSeason = Matrix.zeros(period, period).set(0, period - 1, 1);
  for (let row = 1; row < period; row++) moveSeason.set(row, row - 1, 1);
  const learnSeason = Matrix.zeros(period, period).set(0, period - 1, gamma);

  const observe = product(observeSeason, observeLevel);
  const move = product(moveSeason, moveLevel);
  const learn = product(learnSeason, learnLevel);
  const mixed = product(learnSeason, moveLevel).add(product(moveSeason, learnLevel));

  const level = trended ? [run.end.level, run.end.slope] : [run.end.level];
  let means = Matrix.columnVector(level).mmul(Matrix.rowVector(run.end.season));
  let spread = Matrix.zeros(means.size, means.size);
  return Array.from({ length: horizon }, () => {
    const mean = observeLevel.mmul(means).mmul(observeSeason.transpose()).get(0, 0);
    const ofState = observe.mmul(spread).mmul(observe.transpose()).get(0, 0);
    const ahead = { mean, variance: (1 + variance) * ofState + variance * mean * mean };
    const point = stacked(means);
    const square = point.mmul(point.transpose());
    const crossed = move.mmul(spread).mmul(learn.transpose());
    spread = move
      .mmul(spread)
      .mmul(move.transpose())
      .add(
        crossed
          .clone()
          .add(crossed.transpose())
          .add(mixed.mmul(spread.clone().add(square)).mmul(mixed.transpose()))
          .add(
            learn
              .mmul(spread.clone().mul(3).add(square.clone().mul(2)))
              .mmul(learn.transpose())
              .mul(variance),
          )
          .mul(variance),
      );
    means = moveLevel
      .mmul(means)
      .mmul(moveSeason.transpose())
      .add(learnLevel.mmul(means).mmul(learnSeason.transpose()).mul(variance));
    return ahead;
  });
};
