import { formatCount, plural } from '@/lib/format';
import { LEAST_LIKE_JOBS } from '@/lib/like-jobs';
import type { LowRecoveries } from './contract';

type Judged = LowRecoveries['judged'];

/** How many of the judged recoveries lie far below like jobs. */
export const lowAnswer = ({ records, low }: Judged): string => {
  if (records === 0) return 'Too few like jobs to say anything.';
  if (low === 0)
    return records === 1
      ? 'The one recovery judged is not far below like jobs.'
      : `None of ${plural(records, 'recovery', 'recoveries')} lies far below like jobs.`;
  return `${formatCount(low)} of ${plural(records, 'recovery', 'recoveries')} ${low === 1 ? 'lies' : 'lie'} far below like jobs.`;
};

/** About how many recoveries nothing is said, and why; empty when about none. */
export const unjudgedNote = ({ tooFewLikeJobs }: Judged): string =>
  tooFewLikeJobs === 0
    ? ''
    : `About ${plural(tooFewLikeJobs, 'other', 'others')} nothing is said: fewer than ${LEAST_LIKE_JOBS} jobs are like ${tooFewLikeJobs === 1 ? 'it' : 'them'}.`;
