import { z } from 'zod';
import { annualizedRate } from '@/analytics/leak-rate/annualizing';
import { rollingAverageRate } from '@/analytics/leak-rate/rolling-average';
import { checkReference } from '../statistics/reference';

const inputSchema = z.object({
  additions_lb: z.array(z.number()),
  days_since_previous_addition: z.array(z.number()),
  full_charge_lb: z.number(),
  rolling_sum_lb: z.number(),
});

checkReference(
  'leak-rate',
  { relative: 1e-12 },
  {
    leak_rate: (entry, compare) => {
      const input = inputSchema.parse(entry.input);
      compare(
        {
          annualizing_percent: input.additions_lb.map((added, index) =>
            annualizedRate(added, input.full_charge_lb, input.days_since_previous_addition[index] ?? null),
          ),
          rolling_percent: rollingAverageRate(input.rolling_sum_lb, input.full_charge_lb),
        },
        entry.expected,
      );
    },
  },
);
