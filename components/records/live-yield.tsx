import { Notice } from '@/components/ui/notice';
import { formatMassWithUnit, formatPercent } from '@/lib/format';
import type { RecordTexts } from '@/lib/recoveries/fields';
import { type LiveYield, liveYield } from '@/lib/recoveries/live-yield';
import type { DisplayUnit } from '@/lib/vocabulary';

/** A little over the full charge is the scale and the nameplate; more than this is a slip. */
const DOUBTFUL_YIELD = 1.05;

const sentence = ({ recoveredMassKg, fullChargeKg }: LiveYield, unit: DisplayUnit): string => {
  if (recoveredMassKg === null) return 'The recovered mass follows from the weights';
  const recovered = `${formatMassWithUnit(recoveredMassKg, unit, 2)} recovered`;
  return fullChargeKg === null ? recovered : `${recovered} of ${formatMassWithUnit(fullChargeKg, unit, 2)}`;
};

/** The ticket so far: what the figures typed say, before anything is sent. */
export const LiveYieldLine = ({ texts, unit }: { texts: RecordTexts; unit: DisplayUnit }) => {
  const live = liveYield(texts);
  return (
    <div aria-live="polite" className="mb-5">
      <p className="flex items-baseline justify-between gap-6 border-y-2 border-ink py-2 font-mono">
        <span className="text-sm text-ink-2">{sentence(live, unit)}</span>
        <span className="shrink-0 text-xl font-medium">{live.yield === null ? '—' : formatPercent(live.yield)}</span>
      </p>
      {live.yield !== null && live.yield > DOUBTFUL_YIELD ? (
        <Notice tone="warning" title="More than the full charge" className="mt-3">
          Look at the weights, the unit and the nameplate again. If they are right, stop and check how full the cylinder
          is.
        </Notice>
      ) : null}
    </div>
  );
};
