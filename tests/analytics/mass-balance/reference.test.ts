import { z } from 'zod';
import { annualizedRate } from '@/analytics/leak-rate/annualizing';
import { rollingAverageRate } from '@/analytics/leak-rate/rolling-average';
import { massBalance } from '@/analytics/mass-balance/balance';
import { normalisedError } from '@/analytics/mass-balance/settlement';
import { weighed } from '@/analytics/mass-balance/weighing';
import { checkReference } from '../statistics/reference';

const numbers = z.array(z.number());

checkReference(
  'massbalance',
  { relative: 1e-12, absolute: 1e-12 },
  {
    single_recovery: (entry, compare) => {
      const schema = z.object({
        start: z.number(),
        end: z.number(),
        resolution: z.number(),
        repeatability: z.number(),
        relative_slope_u: z.number(),
        holdup_u: z.number(),
      });
      const { start, end, resolution, repeatability, relative_slope_u, holdup_u } = schema.parse(entry.input);
      const own = weighed(start, end, { resolution, repeatability, slope: relative_slope_u, holdUp: holdup_u });
      compare(
        {
          net: own.net,
          u_random: own.random,
          u_slope: own.systematic,
          u: own.standardError,
          expanded_k2: own.expanded,
          relative_u: own.relative,
        },
        entry.expected,
      );
    },
    cylinder_balance: (entry, compare) => {
      const schema = z.object({
        recovered: numbers,
        u_each: numbers,
        slope_u_own_scale: z.number(),
        shipped: z.number(),
        u_shipped: z.number(),
        slope_u_their_scale: z.number(),
        opening: z.number(),
        closing: z.number(),
        u_stock: z.number(),
      });
      const input = schema.parse(entry.input);
      const own = massBalance({
        recovered: input.recovered,
        recoveredErrors: input.u_each,
        ownSlope: input.slope_u_own_scale,
        shipped: input.shipped,
        shippedError: input.u_shipped,
        theirSlope: input.slope_u_their_scale,
        opening: input.opening,
        closing: input.closing,
        stockError: input.u_stock,
      });
      compare(
        {
          difference: own.difference,
          u_random: own.random,
          u_systematic: own.systematic,
          u: own.standardError,
          z: own.z,
          p_two_sided: own.p,
          flag: own.verdict,
          percent_of_recovered: own.percentOfRecovered,
        },
        entry.expected,
      );
    },
    settlement_En: (entry, compare) => {
      const schema = z.object({
        own: z.number(),
        U_own: z.number(),
        settlement: z.number(),
        U_settlement: z.number(),
      });
      const { own, U_own, settlement, U_settlement } = schema.parse(entry.input);
      const { difference, en, agree } = normalisedError(
        { mass: own, expanded: U_own },
        { mass: settlement, expanded: U_settlement },
      );
      compare({ difference, En: en, agree }, entry.expected);
    },
    leak_rate: (entry, compare) => {
      const schema = z.object({
        additions_lb: numbers,
        days_since_previous_addition: numbers,
        full_charge_lb: z.number(),
        rolling_sum_lb: z.number(),
      });
      const input = schema.parse(entry.input);
      compare(
        {
          annualizing_percent: input.additions_lb.map((added, at) =>
            annualizedRate(added, input.full_charge_lb, input.days_since_previous_addition[at] ?? null),
          ),
          rolling_percent: rollingAverageRate(input.rolling_sum_lb, input.full_charge_lb),
        },
        entry.expected,
      );
    },
  },
);
