import Link from 'next/link';
import type { ReactNode } from 'react';
import { monthsAfter, type StackedMonth } from '@/analytics/monthly-trends/series';
import type { ScopeSelection } from '@/analytics/scope-address';
import { Ticket, type TicketRow } from '@/components/ui/ticket';
import { useMay } from '@/components/viewer-context';
import { formatCount, formatMass, formatMonth, formatNumber, formatPercent } from '@/lib/format';
import { recordsHref, screenHref } from './records-link';
import { stateWord } from './wording';

const share = (value: number | null, digits: number): string => (value === null ? '—' : formatPercent(value, digits));

/** Part of those that state it, and the same of the year before where that month is whole. */
const habit = (
  month: StackedMonth,
  then: StackedMonth | undefined,
  part: 'held' | 'downToLevel',
  stated: 'holdStated' | 'vacuumStated',
): Pick<TicketRow, 'value' | 'small'> => {
  const of = (one: StackedMonth) => share(one[stated] > 0 ? one[part] / one[stated] : null, 0);
  return {
    value: of(month),
    small: then?.state === 'whole' && then[stated] > 0 ? `a year before ${of(then)}` : undefined,
  };
};

const KG_PER_TONNE = 1000;

type MonthTicketProps = {
  month: StackedMonth;
  months: readonly StackedMonth[];
  scope: ScopeSelection;
  className?: string;
};

/** One month as a weigh ticket: net mass, recoveries, yields, CO2-equivalent, what to look at. */
export const MonthTicket = ({ month, months, scope, className }: MonthTicketProps) => {
  const mayLook = useMay('flags:read');
  const records = recordsHref(scope, month.month) ?? '/records';
  const opens = (figure: ReactNode, href = records) => (
    <Link href={href} className="figure-link">
      {figure}
    </Link>
  );
  const then = months.find((other) => other.month === monthsAfter(month.month, -12));
  const flagged =
    month.flagged > 0 ? <span className="marked">{formatCount(month.flagged)}</span> : formatCount(month.flagged);
  const rows: TicketRow[] = [
    { label: 'Recoveries', value: opens(formatCount(month.recoveries)) },
    {
      label: 'Total yield',
      value: share(month.totalYield, 1),
      small: then?.state === 'whole' ? `a year before ${share(then.totalYield, 1)}` : undefined,
    },
    { label: 'Median yield', value: share(month.medianYield, 0) },
    { label: 'Held', ...habit(month, then, 'held', 'holdStated') },
    { label: 'Down to level', ...habit(month, then, 'downToLevel', 'vacuumStated') },
    {
      label: 'Kept from the air',
      value: `${formatNumber(month.co2e / KG_PER_TONNE, month.co2e < 100 * KG_PER_TONNE ? 1 : 0)} t`,
      small: 'CO₂e, AR4',
    },
    {
      label: 'Far below like jobs',
      value: mayLook ? opens(flagged, screenHref('/low-recoveries', scope, month.month)) : flagged,
    },
  ];
  return (
    <Ticket
      heading={formatMonth(month.month)}
      of={stateWord(month) || 'the whole month'}
      net={{ figure: opens(formatMass(month.recoveredMass, scope.unit)), unit: `${scope.unit} net` }}
      rows={rows}
      {...(className ? { className } : {})}
    />
  );
};
