import { readSort, type Sort } from '@/analytics/records/constants';
import { Term } from '@/components/glossary/term';
import { Th } from '@/components/ui/table';
import { COLUMN_TERMS, type ColumnId } from './column-list';
import { NUMERIC_COLUMNS } from './columns';

type SortHeaderProps = { id: ColumnId; sort: Sort; onSort: (sort: Sort) => void; children: string };

/** A head that sorts: the first press up from the least (dates and figures down), the next turns it round. */
export const SortHeader = ({ id, sort, onSort, children }: SortHeaderProps) => {
  const { key, descending } = readSort(sort);
  const sorted = key === id;
  const numeric = NUMERIC_COLUMNS.has(id);
  const startsDown = numeric || id === 'recoveredOn';
  const term = COLUMN_TERMS[id];
  const next: Sort = (sorted ? !descending : startsDown) ? `-${id}` : id;
  return (
    <Th
      numeric={numeric}
      {...(sorted ? { 'aria-sort': descending ? ('descending' as const) : ('ascending' as const) } : {})}
    >
      {numeric && term ? <Term id={term} /> : null}
      <button
        type="button"
        onClick={() => onSort(next)}
        className={`inline-flex items-baseline gap-1 text-inherit hover:text-act pointer-coarse:min-h-11 pointer-coarse:items-center ${
          sorted ? 'font-semibold text-ink' : ''
        }`}
      >
        {children}
        <span aria-hidden="true" className={sorted ? '' : 'invisible'}>
          {sorted && !descending ? '↑' : '↓'}
        </span>
      </button>
      {!numeric && term ? <Term id={term} /> : null}
    </Th>
  );
};
