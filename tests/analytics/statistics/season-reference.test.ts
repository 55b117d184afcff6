import { z } from 'zod';
import { classicalDecomposition } from '@/analytics/statistics/season/classical-decomposition';
import { stl } from '@/analytics/statistics/season/stl';
import { stlPlan } from '@/analytics/statistics/season/stl-options';
import { strengths } from '@/analytics/statistics/season/strength';
import { given } from './given';
import { checkReference } from './reference';

const stlInput = z.object({
  y: z.array(z.number()),
  frequency: z.number(),
  s_window: z.union([z.number(), z.literal('periodic')]),
  robust: z.boolean(),
  jumps: z.string(),
  s_degree: z.number(),
  t_window: z.number(),
  t_degree: z.number(),
  l_window: z.number(),
  l_degree: z.number(),
  inner: z.number(),
  outer: z.number(),
});
const classicalInput = z.object({
  y: z.array(z.number()),
  frequency: z.number(),
  type: z.enum(['additive', 'multiplicative']),
});

checkReference(
  'decomposition',
  { absolute: 1e-8 },
  {
    stl: (entry, compare) => {
      const input = stlInput.parse(entry.input);
      const jump = input.jumps.startsWith('all 1') ? (1 as const) : ('tenth of window' as const);
      const options = { period: input.frequency, seasonWindow: input.s_window, robust: input.robust, jump };
      const plan = stlPlan(input.y.length, options);
      const { t_window, t_degree, l_window, l_degree, s_degree, inner, outer } = input;
      compare(
        {
          t_window: plan.trend.window,
          t_degree: plan.trend.degree,
          l_window: plan.lowPass.window,
          l_degree: plan.lowPass.degree,
          s_degree: plan.season.degree,
          inner: plan.inner,
          outer: plan.outer,
        },
        { t_window, t_degree, l_window, l_degree, s_degree, inner, outer },
      );
      const parts = given(stl(input.y, options));
      const { season, trend } = strengths(parts);
      compare(
        {
          seasonal: parts.season,
          trend: parts.trend,
          remainder: parts.remainder,
          weights: parts.weights,
          trend_strength: trend,
          seasonal_strength: season,
        },
        entry.expected,
      );
    },
    classical_decomposition: (entry, compare) => {
      const { y, frequency, type } = classicalInput.parse(entry.input);
      const { figures, trend } = given(classicalDecomposition(y, frequency, type));
      compare({ figure: figures, trend }, entry.expected);
    },
  },
);
