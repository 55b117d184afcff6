import { RECORD_COLUMNS, RECORD_NAMES } from '../record-columns';

const columns = RECORD_COLUMNS.map(({ column, type }) => `${column} ${type}`);
const names = RECORD_NAMES.map(({ name }) => `${name} text`);

/** The file's rows as read, before anything is decided. Gone with the transaction. */
export const CREATE_STAGED_ROWS = `
  create temp table staged_rows (
    line integer not null,
    record_ref text,
    cells jsonb,
    -- Set for rows that the reader refused; such rows state nothing else.
    reasons jsonb,
    source_hash text,
    entered jsonb,
    extra jsonb,
    ${[...columns, ...names].join(',\n    ')}
  ) on commit drop`;

/** In the order in which stage.ts writes the values. */
export const COPY_STAGED_ROWS = `
  copy staged_rows (line, record_ref, cells, reasons, source_hash, entered, extra,
                    ${[...RECORD_COLUMNS.map((c) => c.column), ...RECORD_NAMES.map((n) => n.name)].join(', ')})
  from stdin`;

/** The planner knows nothing of a fresh temporary table. */
export const ANALYZE_STAGED_ROWS = 'analyze staged_rows';
