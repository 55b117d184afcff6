import type { ReactNode } from 'react';
import { monthInScope } from '@/analytics/figures/figure';
import type { Measure } from '@/analytics/figures/measures';
import { monthsAfter, type StackedMonth } from '@/analytics/monthly-trends/series';
import type { ScopeSelection } from '@/analytics/scope-address';
import { FigureLink } from '@/components/figures/figure-link';
import { formatCo2e } from '@/components/figures/wording';
import { Term } from '@/components/glossary/term';
import { Ticket, type TicketRow } from '@/components/ui/ticket';
import { useMay } from '@/components/viewer-context';
import { formatCount, formatMass, formatMonth, formatPercent } from '@/lib/format';
import { stateWord } from './wording';

const share = (value: number | null, digits: number): string => (value === null ? '—' : formatPercent(value, digits));

/** Part of those that state it, and the same of the year before where that month is whole. */
const habit = (
  month: StackedMonth,
  then: StackedMonth | undefined,
  part: 'held' | 'downToLevel',
  stated: 'holdStated' | 'vacuumStated',
  opens: (text: string) => ReactNode,
): Pick<TicketRow, 'value' | 'small'> => {
  const of = (one: StackedMonth) => share(one[stated] > 0 ? one[part] / one[stated] : null, 0);
  return {
    value: opens(of(month)),
    small: then?.state === 'whole' && then[stated] > 0 ? `a year before ${of(then)}` : undefined,
  };
};

type MonthTicketProps = {
  month: StackedMonth;
  months: readonly StackedMonth[];
  scope: ScopeSelection;
  className?: string;
};

/** One month as a weigh ticket: net mass, recoveries, yields, CO2-equivalent, what to look at. */
export const MonthTicket = ({ month, months, scope, className }: MonthTicketProps) => {
  const mayLook = useMay('flags:read');
  const own = monthInScope(scope, month.month);
  const opens = (measure: Measure, figure: ReactNode) => (
    <FigureLink measure={measure} scope={own}>
      {figure}
    </FigureLink>
  );
  const then = months.find((other) => other.month === monthsAfter(month.month, -12));
  const flagged =
    month.flagged > 0 ? <span className="marked">{formatCount(month.flagged)}</span> : formatCount(month.flagged);
  const rows: TicketRow[] = [
    { label: 'Recoveries', value: opens('recoveries', formatCount(month.recoveries)) },
    {
      label: <Term id="total-yield">Total yield</Term>,
      value: opens('totalYield', share(month.totalYield, 1)),
      small: then?.state === 'whole' ? `a year before ${share(then.totalYield, 1)}` : undefined,
    },
    { label: <Term id="median-yield">Median yield</Term>, value: opens('medianYield', share(month.medianYield, 0)) },
    {
      label: <Term id="hold">Held</Term>,
      ...habit(month, then, 'held', 'holdStated', (text) => opens('heldShare', text)),
    },
    {
      label: <Term id="down-to-level">Down to level</Term>,
      ...habit(month, then, 'downToLevel', 'vacuumStated', (text) => opens('downToLevelShare', text)),
    },
    {
      label: <Term id="co2-equivalent">Kept from the air</Term>,
      value: opens('co2e', formatCo2e(month.co2e)),
      small: 'CO₂e, AR4',
    },
    {
      label: <Term id="far-below-like-jobs">Far below like jobs</Term>,
      value: mayLook ? opens('flagged', flagged) : flagged,
    },
  ];
  return (
    <Ticket
      heading={formatMonth(month.month)}
      of={stateWord(month) || 'the whole month'}
      net={{ figure: opens('recoveredMass', formatMass(month.recoveredMass, scope.unit)), unit: `${scope.unit} net` }}
      rows={rows}
      {...(className ? { className } : {})}
    />
  );
};
