import Link from 'next/link';
import type { FigureScope } from '@/analytics/figures/figure';
import type { LowRecovery } from '@/analytics/low-recoveries/contract';
import { EVERY_RECORD } from '@/analytics/scope-address';
import { FigureLink } from '@/components/figures/figure-link';
import { choiceName } from '@/components/scope/wording';
import { formatCount, formatDay, formatDesignation, formatMass, formatMassWithUnit, formatPercent } from '@/lib/format';
import type { DisplayUnit } from '@/lib/vocabulary';
import { YieldStrip } from './yield-strip';

/** Like jobs are those of the company's whole record, whatever the scope. */
const likeJobsOf = ({ refrigerant, category }: LowRecovery): FigureScope => ({
  ...EVERY_RECORD,
  refrigerant: [refrigerant],
  category: [category],
});

const LowItem = ({ item, unit }: { item: LowRecovery; unit: DisplayUnit }) => (
  <li className="grid gap-x-8 gap-y-1.5 border-b border-rule-2 py-3.5 last:border-b-0 md:grid-cols-[minmax(0,1.2fr)_minmax(0,1fr)_minmax(0,1fr)] md:items-center">
    <div className="min-w-0">
      <p className="flex flex-wrap items-baseline gap-x-3">
        <Link href={`/records/${item.recoveryId}`} className="link font-semibold break-words">
          {item.recordRef}
        </Link>
        <span className="text-sm text-ink-2">{formatDay(item.recoveredOn)}</span>
      </p>
      <p className="text-sm break-words text-ink-2">
        {item.technician} at {item.site}, {formatDesignation(item.appliance)}
      </p>
      <p className="text-sm text-ink-2">
        {formatDesignation(item.refrigerant)}, {choiceName('category', item.category)}
      </p>
    </div>
    <p className="min-w-0">
      <Link href={`/records/${item.recoveryId}`} className="figure-link font-mono text-lg font-medium">
        {formatPercent(item.yield)}
      </Link>{' '}
      <span className="text-ink-2">
        yield: {formatMass(item.recoveredMass, unit)} of {formatMassWithUnit(item.fullCharge, unit)}
      </span>
      <span className="block text-sm text-ink-2">
        median of{' '}
        <FigureLink measure="recoveries" scope={likeJobsOf(item)}>
          {formatCount(item.likeJobs)} like jobs
        </FigureLink>{' '}
        <FigureLink measure="medianYield" scope={likeJobsOf(item)}>
          {formatPercent(item.medianYield)}
        </FigureLink>
      </span>
    </p>
    <YieldStrip {...item} />
  </li>
);

/** Low recoveries one under the other, each with where it lies among like jobs. */
export const LowList = ({ items, unit }: { items: readonly LowRecovery[]; unit: DisplayUnit }) => (
  <ol>
    {items.map((item) => (
      <LowItem key={item.recoveryId} item={item} unit={unit} />
    ))}
  </ol>
);
