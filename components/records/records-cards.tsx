import type { RecordRow } from '@/analytics/records/contract';
import { formatDay, formatDesignation, formatMassWithUnit, formatPercent } from '@/lib/format';
import type { DisplayUnit } from '@/lib/vocabulary';
import { RecordLink } from './record-link';

/** One page of records in two lines each, for a phone; the whole entry opens the record. */
export const RecordsCards = ({ rows, unit }: { rows: readonly RecordRow[]; unit: DisplayUnit }) => (
  <ul aria-label="Records">
    {rows.map((row) => (
      <li key={row.id} className="border-b border-rule-2 last:border-b-0">
        <RecordLink id={row.id} className="block py-2.5 text-inherit hover:bg-sheet-2">
          <span className="flex items-baseline justify-between gap-4">
            <span className="link min-w-0 truncate font-medium">{row.recordRef}</span>
            <span className="shrink-0 font-medium">
              {formatMassWithUnit(row.recoveredMass, unit, 2)}
              <span className={row.exclusion ? 'marked ml-2' : 'ml-2 font-normal text-ink-2'}>
                {formatPercent(row.yield)}
              </span>
            </span>
          </span>
          <span className="mt-0.5 block text-sm text-ink-2">
            {formatDay(row.recoveredOn)} · {formatDesignation(row.refrigerant)} · {row.technician} · {row.site},{' '}
            {row.appliance}
          </span>
        </RecordLink>
      </li>
    ))}
  </ul>
);
