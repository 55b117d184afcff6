import Link from 'next/link';
import type { Start } from '@/analytics/start/contract';
import { wholeScope } from '@/analytics/start/sentence';
import { certaintyWords, moverNote, periodWords } from '@/analytics/trends-comparison/sentence';
import { FigureLink } from '@/components/figures/figure-link';
import { choiceName } from '@/components/scope/wording';
import { searchString } from '@/lib/api/client';
import { formatMassWithUnit, formatMonth } from '@/lib/format';
import type { DisplayUnit } from '@/lib/vocabulary';

type WhatChangedProps = { start: Start; unit: DisplayUnit };

/** The last whole month beside the same one a year before, in words, and what people noted since. Nothing for who may read neither. */
export const WhatChanged = ({ start: { comparison, notes, latest }, unit }: WhatChangedProps) => {
  if (!latest || (!comparison && !notes.length)) return null;
  const told = comparison
    ? [
        moverNote(comparison, 'refrigerant', unit, (key) => choiceName('refrigerant', key)),
        certaintyWords(comparison),
      ].filter(Boolean)
    : [];
  return (
    <section aria-labelledby="what-changed">
      <h2 id="what-changed" className="border-b-2 border-ink pb-1.5 text-lg font-semibold">
        What changed
      </h2>
      {comparison ? (
        <p className="max-w-prose py-4">
          {periodWords(comparison.before)} had brought in{' '}
          <FigureLink
            measure="recoveredMass"
            scope={wholeScope(comparison.before.from.slice(0, 7), comparison.before.to.slice(0, 7))}
          >
            {formatMassWithUnit(comparison.before.recoveredMass, unit, 0)}
          </FigureLink>
          . {told.join(' ')}{' '}
          <Link href={`/trends${searchString({ from: latest.month, to: latest.month })}`} className="link">
            {formatMonth(latest.month)} in full
          </Link>
        </p>
      ) : null}
      {notes.length ? (
        <ul className="flex flex-col gap-3 pb-2">
          {notes.map(({ id, from, to, text, writtenBy }) => (
            <li key={id} className="border-l-3 border-shoulder pl-3">
              <p className="max-w-prose break-words">{text}</p>
              <p className="text-sm text-ink-2">
                {writtenBy}, on{' '}
                <Link className="link" href={`/trends${searchString({ from: from.slice(0, 7), to: to.slice(0, 7) })}`}>
                  {periodWords({ from, to })}
                </Link>
              </p>
            </li>
          ))}
        </ul>
      ) : null}
    </section>
  );
};
