import type { Piece } from '@/analytics/figures/pieces';
import { formatCount, plural } from '@/lib/format';
import { LEAST_LIKE_JOBS } from '@/lib/like-jobs';
import type { LowRecoveries } from './contract';

type Judged = LowRecoveries['judged'];

/** How many of the judged recoveries lie far below like jobs. */
export const lowAnswer = ({ records, low }: Judged): Piece[] => {
  if (records === 0) return ['Too few like jobs to say anything.'];
  const judged: Piece = { measure: 'judged', figure: plural(records, 'recovery', 'recoveries') };
  if (low === 0)
    return records === 1
      ? ['The ', { ...judged, figure: 'one recovery' }, ' judged is not far below like jobs.']
      : ['None of ', judged, ' lies far below like jobs.'];
  const flagged: Piece = { measure: 'flagged', figure: formatCount(low) };
  return [flagged, ' of ', judged, ` ${low === 1 ? 'lies' : 'lie'} far below like jobs.`];
};

/** About how many recoveries nothing is said, and why; empty when about none. */
export const unjudgedNote = ({ tooFewLikeJobs }: Judged): Piece[] =>
  tooFewLikeJobs === 0
    ? []
    : [
        'About ',
        { measure: 'unjudged', figure: plural(tooFewLikeJobs, 'other', 'others') },
        ` nothing is said: fewer than ${LEAST_LIKE_JOBS} jobs are like ${tooFewLikeJobs === 1 ? 'it' : 'them'}.`,
      ];
