import Link from 'next/link';
import type { Flag } from '@/analytics/flags/contract';
import { choiceName } from '@/components/scope/wording';
import { formatDay, formatDesignation, formatMass, formatMassWithUnit } from '@/lib/format';
import type { DisplayUnit } from '@/lib/vocabulary';

/** Which record a flag is about: its ref, day, people and place, and what came out of what. */
export const FlagFacts = ({ flag, unit }: { flag: Flag; unit: DisplayUnit }) => (
  <div className="min-w-0">
    <p className="flex flex-wrap items-baseline gap-x-3">
      <Link href={`/records/${flag.recoveryId}`} className="link font-semibold break-words">
        {flag.recordRef}
      </Link>
      <span className="text-sm text-ink-2">{formatDay(flag.recoveredOn)}</span>
    </p>
    <p className="font-mono">
      {formatMass(flag.recoveredMass, unit, 2)}{' '}
      <span className="text-sm text-ink-2">of {formatMassWithUnit(flag.fullCharge, unit, 2)}</span>
    </p>
    <p className="text-sm break-words text-ink-2">
      {flag.technician} at {flag.site}, {formatDesignation(flag.appliance)}
    </p>
    <p className="text-sm text-ink-2">
      {formatDesignation(flag.refrigerant)}, {choiceName('category', flag.category)},{' '}
      {choiceName('jobType', flag.jobType)}
    </p>
  </div>
);
