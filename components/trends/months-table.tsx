import Link from 'next/link';
import type { ReactNode } from 'react';
import type { Dimension } from '@/analytics/dimensions';
import type { StackedMonth, Stacks } from '@/analytics/monthly-trends/series';
import type { ScopeSelection } from '@/analytics/scope-address';
import { NoteNumber } from '@/components/notes/note-number';
import { type NumberedNote, notesOfMonth } from '@/components/notes/numbered';
import { Table, Td, Th } from '@/components/ui/table';
import { formatChange, formatCount, formatMass, formatMonth, formatPercent } from '@/lib/format';
import { recordsHref } from './records-link';
import { layerName, stateWord } from './wording';

type MonthsTableProps = {
  stacks: Stacks;
  by: Dimension;
  scope: ScopeSelection;
  colours: Record<string, string>;
  notes?: readonly NumberedNote[];
};

const against = ({ recoveredMass, yearBefore, state }: StackedMonth): string =>
  yearBefore === null || yearBefore === 0 || state !== 'whole' ? '—' : formatChange(recoveredMass / yearBefore - 1);

const Figure = ({ href, children }: { href: string | null; children: string }) =>
  href ? (
    <Link href={href} className="figure-link decoration-transparent hover:decoration-current">
      {children}
    </Link>
  ) : (
    children
  );

/** A heading with its unit on a line of its own, so that many columns fit. */
const UnitHead = ({ unit, children }: { unit: string; children: ReactNode }) => (
  <Th numeric className="max-w-36 whitespace-normal!">
    {children}
    <span className="sr-only">,</span> <span className="block font-normal">{unit}</span>
  </Th>
);

/** The chart in figures, newest month first; every figure opens the records behind it. */
export const MonthsTable = ({ stacks: { layers, months }, by, scope, colours, notes = [] }: MonthsTableProps) => (
  <Table label={`Recovered mass by month and ${by === 'jobType' ? 'job type' : by}`}>
    <thead>
      <tr>
        <Th>Month</Th>
        {layers.map((layer) => (
          <UnitHead key={layer.id} unit={scope.unit}>
            <span className="inline-flex items-baseline gap-1.5">
              <span aria-hidden="true" className="size-2.5 shrink-0" style={{ background: colours[layer.id] }} />
              <span className="w-min">{layerName(by, layer)}</span>
            </span>
          </UnitHead>
        ))}
        <UnitHead unit={scope.unit}>All</UnitHead>
        <Th numeric className="max-w-28 min-w-24 whitespace-normal!">
          Against the year before
        </Th>
        <Th numeric>Recoveries</Th>
        <Th numeric className="min-w-16 whitespace-normal!">
          Median yield
        </Th>
      </tr>
    </thead>
    <tbody>
      {[...months].reverse().map((month) => {
        const all = month.recoveries ? recordsHref(scope, month.month) : null;
        return (
          <tr key={month.month} className={month.state === 'whole' ? undefined : 'text-ink-2'}>
            <Th scope="row" className="whitespace-nowrap">
              {formatMonth(month.month, 'short')}
              {notesOfMonth(notes, month.month).map((note) => (
                <span key={note.id} className="ml-1.5">
                  <NoteNumber note={note} />
                </span>
              ))}
              {month.state === 'whole' ? null : (
                <span className="ml-2 bg-sheet-2 px-1.5 py-0.5 text-xs">{stateWord(month)}</span>
              )}
            </Th>
            {layers.map((layer) => {
              const mass = month.layers[layer.id] ?? 0;
              return (
                <Td key={layer.id} numeric>
                  {mass > 0 ? (
                    <Figure href={recordsHref(scope, month.month, { by, keys: layer.members })}>
                      {formatMass(mass, scope.unit)}
                    </Figure>
                  ) : (
                    <span className="text-ink-3">–</span>
                  )}
                </Td>
              );
            })}
            <Td numeric className="font-semibold">
              <Figure href={all}>{formatMass(month.recoveredMass, scope.unit)}</Figure>
            </Td>
            <Td numeric>{against(month)}</Td>
            <Td numeric>
              <Figure href={all}>{formatCount(month.recoveries)}</Figure>
            </Td>
            <Td numeric>{month.medianYield === null ? '—' : formatPercent(month.medianYield)}</Td>
          </tr>
        );
      })}
    </tbody>
  </Table>
);
