import { clsx } from 'clsx';
import type { ReactNode } from 'react';

/** One line of a ticket; `small` is said under the value. */
export type TicketRow = { label: ReactNode; value: ReactNode; small?: ReactNode };

type TicketProps = {
  heading: ReactNode;
  /** Which period, which scope. */
  of?: ReactNode;
  net?: { figure: ReactNode; unit: ReactNode; small?: ReactNode };
  rows: readonly TicketRow[];
  className?: string;
};

/** The weigh ticket: a net figure and its rows, printed in the reading face as a scale would. */
export const Ticket = ({ heading, of, net, rows, className }: TicketProps) => (
  <aside className={clsx('torn my-1.5 bg-sheet px-5 pt-5 pb-5 print:border', className)}>
    <h2 className="font-mono text-sm font-semibold uppercase">{heading}</h2>
    {of ? <p className="mt-0.5 font-mono text-xs text-ink-3">{of}</p> : null}
    {net ? (
      <p className="mt-3 flex items-baseline justify-between gap-3 border-t-2 border-b border-t-ink border-b-rule pt-2 pb-2.5 font-mono">
        <span className="min-w-0 text-3xl font-medium tracking-tighter break-words">{net.figure}</span>
        <span className="shrink-0 text-base text-ink-2">{net.unit}</span>
      </p>
    ) : null}
    {net?.small ? <p className="border-b border-rule-2 py-2 font-mono text-xs text-ink-3">{net.small}</p> : null}
    <dl className={clsx('text-sm', !net && 'mt-3 border-t-2 border-ink')}>
      {rows.map((row, index) => (
        // Rows of a ticket are told in a fixed order.
        // biome-ignore lint/suspicious/noArrayIndexKey: labels are nodes, and the order never changes.
        <div key={index} className="flex justify-between gap-4 border-b border-rule-2 py-1.5">
          <dt className="text-ink-2">{row.label}</dt>
          {/* Figures that open are targets: WCAG 2.2, 2.5.8 asks for 24 pixels. */}
          <dd className="text-right font-mono [&_a]:inline-block [&_a]:leading-6">
            {row.value}
            {row.small ? <span className="block text-xs leading-tight text-ink-3">{row.small}</span> : null}
          </dd>
        </div>
      ))}
    </dl>
  </aside>
);
