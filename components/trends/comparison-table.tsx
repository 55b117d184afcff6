import type { ReactNode } from 'react';
import type { Measure } from '@/analytics/figures/measures';
import type { ScopeSelection } from '@/analytics/scope-address';
import type { Comparison, PeriodFigures, TrendsComparison } from '@/analytics/trends-comparison/contract';
import { periodWords } from '@/analytics/trends-comparison/sentence';
import { FigureLink } from '@/components/figures/figure-link';
import { Term } from '@/components/glossary/term';
import { Table, Td, Th } from '@/components/ui/table';
import { useMay } from '@/components/viewer-context';
import { comparisonRows } from './comparison-rows';

type ComparisonTableProps = {
  comparison: Comparison;
  scope: ScopeSelection;
  gwp: TrendsComparison['gwp'];
  co2eLabel: ReactNode;
};

/** Both periods side by side; every figure opens the records of its days. */
export const ComparisonTable = ({ comparison, scope, gwp, co2eLabel }: ComparisonTableProps) => {
  const mayLook = useMay('flags:read');
  const { now, before } = comparison;
  const side = (one: PeriodFigures, measure: Measure | undefined, text: string, small = '') => (
    <Td numeric className="align-baseline">
      {measure ? (
        <FigureLink
          measure={measure}
          scope={{ ...scope, from: one.from, to: one.to }}
          className="figure-link decoration-transparent hover:decoration-current"
        >
          {text}
        </FigureLink>
      ) : (
        text
      )}
      {small ? <span className="block text-xs whitespace-normal text-ink-2">{small}</span> : null}
    </Td>
  );
  return (
    <Table label={`${periodWords(now)} against ${periodWords(before)}`}>
      <thead>
        <tr>
          <Th>
            <span className="sr-only">Figure</span>
          </Th>
          {[now, before].map((one, index) => (
            <Th key={index === 0 ? 'now' : 'before'} numeric className="min-w-28 whitespace-normal!">
              {periodWords(one)}
            </Th>
          ))}
          <Th numeric>Change</Th>
        </tr>
      </thead>
      <tbody>
        {comparisonRows(comparison, { unit: scope.unit, gwp, co2eLabel, mayLook }).map(
          ({ label, term, measure, figure, small, change, changeSmall }, index) => (
            // Rows are told in a fixed order.
            // biome-ignore lint/suspicious/noArrayIndexKey: labels are nodes, and the order never changes.
            <tr key={index}>
              <Th scope="row" className="align-baseline">
                {term ? <Term id={term}>{label}</Term> : label}
              </Th>
              {side(now, measure, figure(now), small?.(now))}
              {side(before, measure, figure(before), small?.(before))}
              <Td numeric className="align-baseline font-semibold">
                {change}
                {changeSmall ? (
                  <span className="block text-xs font-normal whitespace-normal text-ink-2">{changeSmall}</span>
                ) : null}
              </Td>
            </tr>
          ),
        )}
      </tbody>
    </Table>
  );
};
