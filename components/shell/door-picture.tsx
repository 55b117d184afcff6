import { LikeJobs } from '@/components/records/like-jobs';
import { Ticket } from '@/components/ui/ticket';
import { formatDesignation, formatPercent } from '@/lib/format';

/** One pull out of an invented company: 6.1 lb of a full charge of 10.5 lb, and what like jobs gave. */
const PULL = { netLb: 6.1, fullLb: 10.5 };
const LIKE_JOBS = { count: 212, lowerFence: 0.656, lowerQuartile: 0.836, median: 0.91, upperQuartile: 0.956 };

/** What the product does, shown by its own pieces: a ticket, and where the pull lies among like jobs. */
export const DoorPicture = () => (
  <div className="grid max-w-3xl items-center gap-x-10 gap-y-6 sm:grid-cols-[15rem_minmax(0,1fr)]">
    <Ticket
      heading="Ticket 20417"
      of={`${formatDesignation('R-410A')}, rooftop unit, Nov 12, 2026`}
      net={{ figure: PULL.netLb.toFixed(1), unit: 'lb net' }}
      rows={[
        { label: 'Start weight', value: '24.2 lb' },
        { label: 'End weight', value: '30.3 lb' },
        { label: 'Full charge', value: `${PULL.fullLb} lb` },
        { label: 'Yield', value: <span className="marked">{formatPercent(PULL.netLb / PULL.fullLb)}</span> },
      ]}
    />
    <div className="min-w-0">
      <p className="text-xl leading-tight font-semibold tracking-tight text-balance">
        {PULL.netLb}&nbsp;lb came out. Like jobs give {(LIKE_JOBS.median * PULL.fullLb).toFixed(1)}&nbsp;lb of such a
        charge.
      </p>
      <div className="mt-4 bg-sheet px-4 pt-3 pb-4">
        <LikeJobs recoveryYield={PULL.netLb / PULL.fullLb} likeJobs={LIKE_JOBS} />
      </div>
      <p className="mt-2 text-sm text-ink-2">An invented pull, as Tarebook shows a real one.</p>
    </div>
  </div>
);
