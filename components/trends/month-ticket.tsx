import type { ReactNode } from 'react';
import { monthInScope } from '@/analytics/figures/figure';
import type { Measure } from '@/analytics/figures/measures';
import type { ComparedMonth, StackedMonth } from '@/analytics/monthly-trends/series';
import type { ScopeSelection } from '@/analytics/scope-address';
import { FigureLink } from '@/components/figures/figure-link';
import { formatCo2e } from '@/components/figures/wording';
import { Term } from '@/components/glossary/term';
import { Ticket, type TicketRow } from '@/components/ui/ticket';
import { useMay } from '@/components/viewer-context';
import { formatCount, formatMass, formatMassWithUnit, formatMonth, formatPercent } from '@/lib/format';
import { stateWord } from './wording';

const share = (value: number | null, digits: number): string => (value === null ? '—' : formatPercent(value, digits));

type Habits = Pick<StackedMonth, 'held' | 'holdStated' | 'downToLevel' | 'vacuumStated'>;

/** The part that says yes of those that state a reading; null where none states it. */
const habit = (month: Habits, part: 'held' | 'downToLevel', stated: 'holdStated' | 'vacuumStated'): number | null =>
  month[stated] > 0 ? month[part] / month[stated] : null;

type MonthTicketProps = {
  month: StackedMonth;
  /** The whole month a year before; undefined where there is none to compare with. */
  then: ComparedMonth | undefined;
  scope: ScopeSelection;
  className?: string;
};

/** One month as a weigh ticket: net mass, recoveries, yields, CO2-equivalent, what to look at. */
export const MonthTicket = ({ month, then, scope, className }: MonthTicketProps) => {
  const mayLook = useMay('flags:read');
  const own = monthInScope(scope, month.month);
  const opens = (measure: Measure, figure: ReactNode, of = own) => (
    <FigureLink measure={measure} scope={of}>
      {figure}
    </FigureLink>
  );
  /** The same of the year before, which opens too, whether the scope holds that month or not. */
  const before = (measure: Measure, figure: (then: ComparedMonth) => string | null): ReactNode => {
    const text = then && figure(then);
    return text ? <>a year before {opens(measure, text, { ...scope, from: then.month, to: then.month })}</> : undefined;
  };
  const habitRow = (
    label: ReactNode,
    measure: Measure,
    part: 'held' | 'downToLevel',
    stated: 'holdStated' | 'vacuumStated',
  ): TicketRow => ({
    label,
    value: opens(measure, share(habit(month, part, stated), 0)),
    small: before(measure, (one) => (one[stated] > 0 ? share(habit(one, part, stated), 0) : null)),
  });
  const flagged =
    month.flagged > 0 ? <span className="marked">{formatCount(month.flagged)}</span> : formatCount(month.flagged);
  const rows: TicketRow[] = [
    {
      label: 'Recoveries',
      value: opens('recoveries', formatCount(month.recoveries)),
      small: before('recoveries', (one) => formatCount(one.recoveries)),
    },
    {
      label: <Term id="total-yield">Total yield</Term>,
      value: opens('totalYield', share(month.totalYield, 1)),
      small: before('totalYield', (one) => share(one.totalYield, 1)),
    },
    { label: <Term id="median-yield">Median yield</Term>, value: opens('medianYield', share(month.medianYield, 0)) },
    habitRow(<Term id="hold">Held</Term>, 'heldShare', 'held', 'holdStated'),
    habitRow(<Term id="down-to-level">Down to level</Term>, 'downToLevelShare', 'downToLevel', 'vacuumStated'),
    {
      label: <Term id="co2-equivalent">Kept from the air</Term>,
      value: opens('co2e', formatCo2e(month.co2e)),
      small: 'CO₂e, AR4',
    },
    {
      label: <Term id="flagged">Flagged</Term>,
      value: mayLook ? opens('flagged', flagged) : flagged,
    },
  ];
  return (
    <Ticket
      heading={formatMonth(month.month)}
      of={stateWord(month) || 'the whole month'}
      net={{
        figure: opens('recoveredMass', formatMass(month.recoveredMass, scope.unit)),
        unit: `${scope.unit} net`,
        small: before('recoveredMass', (one) => formatMassWithUnit(one.recoveredMass, scope.unit)),
      }}
      rows={rows}
      {...(className ? { className } : {})}
    />
  );
};
