import type { Flag } from '@/analytics/flags/contract';
import { formatCount, formatPercent } from '@/lib/format';
import { VacuumStrip } from './vacuum-strip';
import { YieldStrip } from './yield-strip';

/** Where this pull lies among like jobs, and its vacuum beside it where that is the reason; nothing where neither is. */
export const FlagPicture = ({ flag }: { flag: Flag }) => {
  const { likeJobs, vacuum } = flag;
  if (!likeJobs && !vacuum) return null;
  return (
    <div className="flex flex-col gap-1.5">
      {likeJobs ? (
        <figure>
          <YieldStrip
            yield={flag.yield}
            lowerQuartile={likeJobs.lowerQuartile}
            medianYield={likeJobs.median}
            upperQuartile={likeJobs.upperQuartile}
            lowerFence={likeJobs.lowerFence}
          />
          <figcaption className="text-xs text-ink-2">
            yield {formatPercent(flag.yield)}, median of {formatCount(likeJobs.jobs)} like jobs{' '}
            {formatPercent(likeJobs.median)}
          </figcaption>
        </figure>
      ) : null}
      {vacuum ? <VacuumStrip {...vacuum} /> : null}
    </div>
  );
};
