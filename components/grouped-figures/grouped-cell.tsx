import type { ReactNode } from 'react';
import { isJudgement } from '@/analytics/figures/measures';
import type { ScopeSelection } from '@/analytics/scope-address';
import { FigureLink } from '@/components/figures/figure-link';
import { formatChange, formatCount, formatDay, formatMass, formatPercent, formatPoints } from '@/lib/format';
import type { GroupedColumn } from './column';

const textOf = (value: string | number, kind: GroupedColumn<never>['kind'], { unit }: ScopeSelection): string => {
  if (typeof value === 'string') return kind === 'day' ? formatDay(value) : value;
  switch (kind) {
    case 'mass':
      return formatMass(value, unit);
    case 'share':
      return formatPercent(value, 1);
    case 'change':
      return formatChange(value);
    case 'points':
      return formatPoints(value);
    default:
      return formatCount(value);
  }
};

/** Among figures of which each opens, lines under all of them would say nothing. */
const QUIET = 'figure-link decoration-transparent hover:decoration-current';

type GroupedCellProps<Row> = {
  column: GroupedColumn<Row>;
  row: Row;
  /** The group's own part of the screen's scope. */
  own: ScopeSelection;
  /** Whether how recoveries stand among like jobs may be looked into. */
  mayLook: boolean;
};

/** One figure of a group, which opens the records that make it. */
export const GroupedCell = <Row,>({ column, row, own, mayLook }: GroupedCellProps<Row>): ReactNode => {
  const { kind, measure, value, draw } = column;
  if (draw) return draw(row, own);
  const cell = value(row);
  if (cell === null) return '—';
  const text = textOf(cell, kind, own);
  if (kind === 'day')
    return (
      <FigureLink measure="recoveries" scope={{ ...own, from: String(cell), to: String(cell) }} className={QUIET}>
        {text}
      </FigureLink>
    );
  if (!measure || (isJudgement(measure) && (!mayLook || cell === 0))) return text;
  return (
    <FigureLink measure={measure} scope={own} className={QUIET}>
      {text}
    </FigureLink>
  );
};
