import { logBeta } from '../../statistics/distributions/log-gamma';
import type { ArrivalMixture } from './mixture';

/**
 * Two kinds of technicians: most stop early as rarely as the middling one, a few have the habit. Common practice; the
 * sizes say how many pulls each expectation counts as.
 */
const ORDINARY_SIZE = 60;
const HABIT = { share: 0.18, size: 10, technicians: 0.08 } as const;
const LEAST_SHARE = 0.001;

type Counts = { pulls: number; stopped: number };

/** Share expected of somebody with these counts, and how well the counts fit, for one kind of technicians. */
const byKind = ({ pulls, stopped }: Counts, share: number, size: number) => {
  const [a, b] = [share * size, (1 - share) * size];
  return {
    share: (stopped + a) / (pulls + size),
    // Beta-binomial, but for the coefficient that both kinds have; counts are sums of probabilities.
    fit: logBeta(stopped + a, pulls - stopped + b) - logBeta(a, b),
  };
};

/** Share of pulls that somebody with these counts stops early: the two kinds weighed by how well they fit. */
const expected = (counts: Counts, middling: number): number => {
  const ordinary = byKind(counts, Math.max(middling, LEAST_SHARE), ORDINARY_SIZE);
  const habit = byKind(counts, HABIT.share, HABIT.size);
  const odds = (HABIT.technicians / (1 - HABIT.technicians)) * Math.exp(habit.fit - ordinary.fit);
  const has = odds === Number.POSITIVE_INFINITY ? 1 : odds / (1 + odds);
  return has * habit.share + (1 - has) * ordinary.share;
};

const NOBODY: Counts = { pulls: 0, stopped: 0 };

/** Share of a technician's pulls that are stopped early; `own` is what this record itself contributed. */
export const stopsEarlyOf = (mixture: ArrivalMixture, technicianId: string, own = NOBODY): number => {
  const known = mixture.stopsEarlyOf[technicianId] ?? NOBODY;
  const pulls = Math.max(0, known.pulls - own.pulls);
  const stopped = Math.min(pulls, Math.max(0, known.stopped - own.stopped));
  return expected({ pulls, stopped }, mixture.stopsEarly);
};
