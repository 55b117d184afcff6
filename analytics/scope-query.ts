import 'server-only';
import { and, gte, isNull, lt, not, or, type SQL, type SQLWrapper, sql } from 'drizzle-orm';
import { recoveryFacts as f } from '@/db/views/recovery-facts';
import { type Dimension, SCOPE_PARTS, type ScopePart, UNSTATED } from './dimensions';
import { dayAfter, firstDay, type Scope } from './scope';

/** Where each dimension stands in the facts. */
export const FACT_COLUMNS = {
  refrigerant: f.refrigerant,
  technician: f.technician,
  site: f.site,
  branch: f.branch,
  category: f.category,
  jobType: f.jobType,
} as const satisfies Record<Dimension, unknown>;

const PART_COLUMNS = { ...FACT_COLUMNS, appliance: f.appliance } as const satisfies Record<ScopePart, unknown>;

/** Whether a column holds one of the values; `unstated` also means rows that say nothing. */
export const isOneOf = (column: SQLWrapper, values: readonly string[] | undefined): SQL | undefined =>
  values?.length ? or(sql`${column} in ${values}`, values.includes(UNSTATED) ? isNull(column) : undefined) : undefined;

// IS TRUE: of a row that says nothing the comparison is NULL, and NOT would leave it NULL.
const isNoneOf = (column: SQLWrapper, values: string[] | undefined): SQL | undefined => {
  const named = isOneOf(column, values);
  return named && not(sql`((${named}) is true)`);
};

/** The rows of the facts view that a scope means; undefined parts do not narrow. */
export const inScope = (scope: Scope): SQL | undefined =>
  and(
    scope.from ? gte(f.recoveredOn, firstDay(scope.from)) : undefined,
    scope.to ? lt(f.recoveredOn, dayAfter(scope.to)) : undefined,
    ...SCOPE_PARTS.map((part) => (scope.except?.includes(part) ? isNoneOf : isOneOf)(PART_COLUMNS[part], scope[part])),
  );
