import { z } from 'zod';
import type { DisplayUnit, FlagRule } from '@/lib/vocabulary';
import type { Flag } from './contract';

const low = z.object({
  peers: z
    .object({
      records: z.number(),
      lowerFence: z.number(),
      lowerQuartile: z.number(),
      median: z.number(),
      upperQuartile: z.number(),
    })
    .nullable(),
  vacuum: z.object({ kpaAbs: z.number(), usualKpaAbs: z.number(), spreadKpa: z.number() }).nullable(),
});

/** Where the yield lies among like jobs, out of a flag's evidence; null where the rule does not compare yields. */
export const likeJobsOf = (evidence: unknown): Flag['likeJobs'] => {
  const peers = low.safeParse(evidence).data?.peers;
  if (!peers) return null;
  const { records, lowerFence, lowerQuartile, median, upperQuartile } = peers;
  return { jobs: records, lowerFence, lowerQuartile, median, upperQuartile };
};

/** Where the final vacuum lies among like jobs; null where the rule does not look at it. */
export const vacuumOf = (evidence: unknown): Flag['vacuum'] => low.safeParse(evidence).data?.vacuum ?? null;

/** A flag's evidence in words. */
export const explainReason = (
  { evidence }: { rule: FlagRule; evidence: unknown; expectedMassKg: number | null },
  _unit: DisplayUnit,
): string => {
  const like = likeJobsOf(evidence);
  return like ? `Unusually low for this kind of job: compared with ${like.jobs} like jobs.` : 'Worth a look.';
};
