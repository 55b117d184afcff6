import { z } from 'zod';
import type { DisplayUnit, FlagRule } from '@/lib/vocabulary';
import type { Flag } from './contract';

const peers = z.object({
  yield: z.number(),
  lower: z.number(),
  q1: z.number(),
  median: z.number(),
  q3: z.number(),
  n: z.number(),
});

/** Where the yield lies among like jobs, out of a flag's evidence; null where the rule does not compare yields. */
export const likeJobsOf = (evidence: unknown): Flag['likeJobs'] => {
  const found = peers.safeParse(evidence);
  if (!found.success) return null;
  const { lower, q1, median, q3, n } = found.data;
  return { jobs: n, lowerFence: lower, lowerQuartile: q1, median, upperQuartile: q3 };
};

/** Where the final vacuum lies among like jobs; null where the rule does not look at it. */
export const vacuumOf = (_evidence: unknown): Flag['vacuum'] => null;

/** A flag's evidence in words. */
export const explainReason = (
  { evidence }: { rule: FlagRule; evidence: unknown; expectedMassKg: number | null },
  _unit: DisplayUnit,
): string => {
  const like = likeJobsOf(evidence);
  return like ? `Unusually low for this kind of job: compared with ${like.jobs} like jobs.` : 'Worth a look.';
};
