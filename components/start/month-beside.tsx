import type { ReactNode } from 'react';
import type { Measure } from '@/analytics/figures/measures';
import { monthsBefore } from '@/analytics/scope-address';
import type { MonthFigures, Start } from '@/analytics/start/contract';
import { wholeScope } from '@/analytics/start/sentence';
import { FigureLink } from '@/components/figures/figure-link';
import { formatCo2e } from '@/components/figures/wording';
import { Term } from '@/components/glossary/term';
import { Ticket, type TicketRow } from '@/components/ui/ticket';
import { formatCount, formatMass, formatMonth, formatPercent } from '@/lib/format';
import type { TermId } from '@/lib/glossary/terms';
import type { DisplayUnit } from '@/lib/vocabulary';

type MonthBesideProps = {
  latest: NonNullable<Start['latest']>;
  unit: DisplayUnit;
  /** Whether the figures are one technician's own. */
  own: boolean;
  className?: string;
};

type Line = { label: string; term?: TermId; measure: Measure; text: (month: MonthFigures) => string };

const share = (value: number | null, digits: number): string => (value === null ? '—' : formatPercent(value, digits));
const part = (count: number, of: number): string => share(of > 0 ? count / of : null, 0);

const LINES: readonly Line[] = [
  { label: 'Recoveries', measure: 'recoveries', text: ({ recoveries }) => formatCount(recoveries) },
  { label: 'Total yield', term: 'total-yield', measure: 'totalYield', text: ({ totalYield }) => share(totalYield, 1) },
  {
    label: 'Median yield',
    term: 'median-yield',
    measure: 'medianYield',
    text: ({ medianYield }) => share(medianYield, 0),
  },
  { label: 'Held', term: 'hold', measure: 'heldShare', text: ({ held, holdStated }) => part(held, holdStated) },
  {
    label: 'Down to level',
    term: 'down-to-level',
    measure: 'downToLevelShare',
    text: ({ downToLevel, vacuumStated }) => part(downToLevel, vacuumStated),
  },
  { label: 'CO₂e', term: 'co2-equivalent', measure: 'co2e', text: ({ co2e }) => formatCo2e(co2e) },
];

/** The latest month as a weigh ticket, each figure with the same of a year before under it; all of them open. */
export const MonthBeside = ({ latest, unit, own, className }: MonthBesideProps) => {
  const { month, whole, now, yearBefore } = latest;
  const before = monthsBefore(month, 12);
  const opens = (of: string, measure: Measure, figure: ReactNode) => (
    <FigureLink measure={measure} scope={wholeScope(of, of)}>
      {figure}
    </FigureLink>
  );
  const rows = LINES.map(
    ({ label, term, measure, text }): TicketRow => ({
      label: term ? <Term id={term}>{label}</Term> : label,
      value: opens(month, measure, text(now)),
      small: yearBefore ? <>a year before {opens(before, measure, text(yearBefore))}</> : undefined,
    }),
  );
  return (
    <Ticket
      heading={formatMonth(month)}
      of={`${whole ? 'the whole month' : 'so far'}${own ? ', your own' : ''}`}
      net={{ figure: opens(month, 'recoveredMass', formatMass(now.recoveredMass, unit)), unit: `${unit} net` }}
      rows={[
        ...(yearBefore
          ? [
              {
                label: 'A year before',
                value: opens(before, 'recoveredMass', formatMass(yearBefore.recoveredMass, unit)),
              },
            ]
          : []),
        ...rows,
      ]}
      {...(className ? { className } : {})}
    />
  );
};
