import { CHRONIC_PERCENT } from '@/analytics/leak-rate/chronic-percent';
import type { ApplianceLeaks } from '@/analytics/leak-rate/contract';
import { Notice } from '@/components/ui/notice';
import { formatMassWithUnit, formatPercent } from '@/lib/format';
import type { DisplayUnit } from '@/lib/vocabulary';

/** Says that the unit took as much in a calendar year as makes a chronic leaker, and by when that is reported. */
export const ChronicNote = ({ years, unit }: { years: ApplianceLeaks['years']; unit: DisplayUnit }) => {
  const chronic = years.filter((year) => year.chronic);
  if (chronic.length === 0) return null;
  return (
    <Notice
      tone="warning"
      className="my-3"
      title={`Took ${formatPercent(CHRONIC_PERCENT / 100)} of its full charge or more in a calendar year`}
    >
      {chronic.map(({ year, added, percent }) => (
        <p key={year}>
          {year}: {formatMassWithUnit(added, unit)}, {formatPercent(percent / 100)} of the full charge. An owner under
          the rule reports that by March 1, {year + 1} (40 CFR 82.157(j), 84.106).
        </p>
      ))}
    </Notice>
  );
};
