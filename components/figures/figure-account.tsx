import type { ReactNode } from 'react';
import type { Explained } from '@/analytics/explain/contract';
import { formulaFilled, leftOutWords } from '@/analytics/explain/formula';
import { useViewer } from '@/components/viewer-context';
import { formatDay, formatInstant, formatMassWithUnit, plural } from '@/lib/format';
import type { DisplayUnit } from '@/lib/vocabulary';

const Line = ({ label, children }: { label: string; children: ReactNode }) => (
  <div className="grid gap-x-6 border-b border-rule-2 py-2 sm:grid-cols-[8.5rem_minmax(0,1fr)]">
    <dt className="text-sm text-ink-2 sm:pt-0.5">{label}</dt>
    <dd className="min-w-0">{children}</dd>
  </div>
);

/** How a figure comes about: its records counted, the formula with its numbers, source, what is missing, how fresh. */
export const FigureAccount = ({ explained, unit }: { explained: Explained; unit: DisplayUnit }) => {
  const { timeZone } = useViewer();
  const { count, sum, formula, source, leftOut, fresh } = explained;
  const left = leftOutWords(leftOut);
  return (
    <>
      <p className="text-lg font-semibold">
        {plural(count, 'recovery', 'recoveries')}, together {formatMassWithUnit(sum, unit)}
      </p>
      <dl className="mt-3 border-t-2 border-ink text-[0.9375rem]">
        <Line label="Computed">
          {formula.words}
          <span className="block font-mono text-sm break-words">{formulaFilled(explained, unit)}</span>
        </Line>
        {source ? <Line label="Source">{source}</Line> : null}
        <Line label="Left out">{left || 'Nothing.'}</Line>
        <Line label="As of">
          {fresh.recordsUntil ? `Records up to ${formatDay(fresh.recordsUntil)}` : 'No records yet'}
          {fresh.lastChangeAt ? `; last changed ${formatInstant(fresh.lastChangeAt, timeZone)}` : ''}.
        </Line>
      </dl>
    </>
  );
};
