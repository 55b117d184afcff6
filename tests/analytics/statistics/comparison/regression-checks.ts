import { expect } from 'vitest';
import { z } from 'zod';
import { quasiBinomial } from '@/analytics/statistics/comparison/quasi-binomial';
import { randomIntercept } from '@/analytics/statistics/comparison/random-intercept';
import { given } from '../given';
import type { Checks } from '../reference';

const numbers = z.array(z.number());
const texts = z.array(z.string());

const mixedModel: Checks[string] = (entry, compare) => {
  const { y, group, x } = z.object({ y: numbers, group: texts, x: numbers.optional() }).parse(entry.input);
  const { published, ...expected } = z
    .looseObject({
      published: z.object({ var_group_0dp: z.number(), var_residual_0dp: z.number(), mean: z.number() }).optional(),
    })
    .parse(entry.expected);
  const fit = given(
    randomIntercept(
      y,
      group,
      y.map((_, row) => (x ? [1, x[row] ?? Number.NaN] : [1])),
    ),
  );
  compare(
    {
      fixef: fit.coefficients,
      fixef_se: fit.standardErrors,
      var_group: fit.groupVariance,
      var_residual: fit.residualVariance,
      reml_criterion: fit.restrictedCriterion,
      group_order: fit.groups.map((own) => own.name),
      blup: fit.groups.map((own) => own.level),
      blup_conditional_sd: fit.groups.map((own) => own.conditionalError),
    },
    expected,
    { relative: 1e-4 },
  );
  if (!published) return;
  const printed = {
    var_group_0dp: fit.groupVariance,
    var_residual_0dp: fit.residualVariance,
    mean: fit.coefficients[0],
  };
  compare(printed, published, { absolute: 0.5, printed: true });
};

const regression: Checks[string] = (entry, compare) => {
  const schema = z.object({ incidence: numbers, size: numbers, period: texts });
  const { incidence, size, period } = schema.parse(entry.input);
  const { coef_names, design_columns, ...expected } = z
    .looseObject({ coef_names: texts, design_columns: texts })
    .parse(entry.expected);
  // The first period is the intercept, each other one a column of its own.
  const periods = [...new Set(period)].sort();
  const columns = ['(Intercept)', ...periods.slice(1).map((name) => `period${name}`)];
  expect(columns).toEqual(coef_names);
  expect(columns).toEqual(design_columns);
  const design = period.map((own) => [1, ...periods.slice(1).map((name) => Number(name === own))]);
  const fit = given(quasiBinomial(design, incidence, size));
  if (!fit.converged) return expect.fail('The regression did not converge');
  const figures = {
    coef: fit.coefficients,
    se: fit.standardErrors,
    dispersion_pearson: fit.dispersion,
    deviance: fit.deviance,
    fitted: fit.fitted,
  };
  return compare(figures, expected, { relative: 1e-6 });
};

export const regressionChecks: Checks = { random_intercept_reml: mixedModel, glm: regression };
