import type { ShownPatternMonth } from '@/analytics/monthly-pattern/contract';
import { isUnusual, unusualWord } from '@/analytics/monthly-pattern/sentence';
import type { ScopeSelection } from '@/analytics/scope-address';
import { FigureLink } from '@/components/figures/figure-link';
import { Table, Td, Th } from '@/components/ui/table';
import { formatMass, formatMonth } from '@/lib/format';

const verdict = (month: ShownPatternMonth): string => {
  if (!month.counts) return 'too few to judge';
  return isUnusual(month) ? unusualWord(month) : 'usual';
};

type SeasonTableProps = { months: readonly ShownPatternMonth[]; scope: ScopeSelection };

/** The figure of season and trend in figures, newest month first; opened by who wants it. */
export const SeasonTable = ({ months, scope }: SeasonTableProps) => (
  <details className="border-t border-rule-2 pt-2.5 pb-1">
    <summary className="link text-sm">The same in figures</summary>
    <div className="mt-3">
      <Table label="Season and trend by month">
        <thead>
          <tr>
            <Th>Month</Th>
            <Th numeric>Recovered, {scope.unit}</Th>
            <Th numeric>Trend, {scope.unit}</Th>
            <Th numeric>Season, times</Th>
            <Th numeric>Usual, {scope.unit}</Th>
            <Th>Verdict</Th>
          </tr>
        </thead>
        <tbody>
          {[...months].reverse().map((month) => (
            <tr key={month.month}>
              <Th scope="row" className="whitespace-nowrap">
                {formatMonth(month.month, 'short')}
              </Th>
              <Td numeric>
                <FigureLink
                  measure="routineMass"
                  scope={{ ...scope, from: month.month, to: month.month }}
                  className="figure-link decoration-transparent hover:decoration-current"
                >
                  {formatMass(month.recoveredMass, scope.unit)}
                </FigureLink>
              </Td>
              <Td numeric>{formatMass(month.trend, scope.unit)}</Td>
              <Td numeric>{month.seasonFactor.toFixed(2)}</Td>
              <Td numeric>
                {formatMass(month.low, scope.unit, 0)} to {formatMass(month.high, scope.unit, 0)}
              </Td>
              <Td>{isUnusual(month) ? <span className="marked">{verdict(month)}</span> : verdict(month)}</Td>
            </tr>
          ))}
        </tbody>
      </Table>
    </div>
  </details>
);
