import { mean } from 'simple-statistics';
import { classicalDecomposition } from '../../season/classical-decomposition';
import { lineThrough } from '../line';
import type { EtsModel, EtsState } from './model';

/** The years that the first season's indices are taken from. */
const PERIODS_FOR_SEASON = 3;
/** A multiplying index this low would make an adjusted value explode. */
const LEAST_INDEX = 1e-2;

const seasonOf = (values: readonly number[], { season, period }: EtsModel): number[] => {
  if (season === 'N') return [];
  const neutral = season === 'A' ? 0 : 1;
  const first = values.slice(0, PERIODS_FOR_SEASON * period);
  const form = season === 'A' ? 'additive' : 'multiplicative';
  const parts = classicalDecomposition(first, period, form);
  return parts.enough ? parts.value.figures : Array.from({ length: period }, () => neutral);
};

/**
 * States to begin the search from: the season of the first three years, then mean or straight line of the first values
 * without it. Hyndman et al. (2002), section 4; as R's forecast package.
 */
export const startingState = (values: readonly number[], model: EtsModel): EtsState => {
  const figures = seasonOf(values, model);
  const length = Math.min(values.length, Math.max(10, 2 * model.period));
  const adjusted = values.slice(0, length).map((value, at) => {
    const figure = figures[at % model.period] ?? 0;
    if (model.season === 'N') return value;
    return model.season === 'A' ? value - figure : value / Math.max(figure, LEAST_INDEX);
  });
  const season = figures.toReversed();
  if (model.trend === 'N') return { level: mean(adjusted), slope: 0, season };
  const { intercept, slope } = lineThrough(adjusted);
  return { level: intercept, slope, season };
};
