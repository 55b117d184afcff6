import type { RecordDetail } from '@/analytics/records/contract';
import { formatCount, formatPercent } from '@/lib/format';

type LikeJobsProps = { recoveryYield: number; likeJobs: NonNullable<RecordDetail['likeJobs']> };

/** The picture ends here unless this pull lies beyond. */
const USUAL_END = 1.2;

/** Where this pull lies among like jobs: the middle half as a band, the lower fence as a line, this pull as a mark. */
export const LikeJobs = ({ recoveryYield, likeJobs }: LikeJobsProps) => {
  const { count, lowerFence, lowerQuartile, median, upperQuartile } = likeJobs;
  const end = Math.max(USUAL_END, recoveryYield * 1.05);
  const at = (share: number): string => `${(Math.min(Math.max(share, 0), end) / end) * 100}%`;
  const below = recoveryYield < lowerFence;
  const words = `This pull brought ${formatPercent(recoveryYield)}. Of ${formatCount(count)} like jobs half lie between ${formatPercent(lowerQuartile)} and ${formatPercent(upperQuartile)}, the middle one at ${formatPercent(median)}.`;
  return (
    <figure>
      <svg role="img" aria-label={words} width="100%" height="56" className="overflow-visible">
        <line x1="0" x2="100%" y1="28" y2="28" stroke="var(--rule)" />
        <rect
          x={at(lowerQuartile)}
          width={`calc(${at(upperQuartile)} - ${at(lowerQuartile)})`}
          y="18"
          height="20"
          fill="var(--act-weak)"
          stroke="var(--act)"
        />
        <line x1={at(median)} x2={at(median)} y1="18" y2="38" stroke="var(--act)" strokeWidth="2" />
        {lowerFence > 0 ? (
          <line x1={at(lowerFence)} x2={at(lowerFence)} y1="14" y2="42" stroke="var(--ink-3)" strokeDasharray="3 3" />
        ) : null}
        <circle
          cx={at(recoveryYield)}
          cy="28"
          r="7"
          fill={below ? 'var(--flag)' : 'var(--ink)'}
          stroke="var(--sheet)"
          strokeWidth="2"
        />
      </svg>
      <figcaption className="mt-1 text-sm text-ink-2">
        {words}
        {below ? ' It lies below the lower fence of like jobs: a reason to look, not a finding.' : ''}
      </figcaption>
    </figure>
  );
};
