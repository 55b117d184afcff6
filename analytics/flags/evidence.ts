import { z } from 'zod';
import { explain } from '@/analytics/judging/explain/explain';
import type { Told } from '@/analytics/judging/judgement';
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

/**
 * A flag's evidence in words, masses in the given unit. Evidence that was decided on long ago may have been written by
 * rules that are others now; it is not guessed at.
 */
export const explainReason = ({ rule, evidence }: { rule: FlagRule; evidence: unknown }, unit: DisplayUnit): string => {
  try {
    // The judging wrote the evidence of a rule as its type says; only the database forgets which type that was.
    return explain({ rule, evidence } as Told, unit);
  } catch {
    return 'Judged by rules that have changed since; the record itself says more.';
  }
};
