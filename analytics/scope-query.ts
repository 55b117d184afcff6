import 'server-only';
import { and, gte, isNull, lt, or, type SQL, type SQLWrapper, sql } from 'drizzle-orm';
import { recoveryFacts as f } from '@/db/views/recovery-facts';
import { type Dimension, UNSTATED } from './dimensions';
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

/** Whether a column holds one of the values; `unstated` also means rows that say nothing. */
export const isOneOf = (column: SQLWrapper, values: string[] | undefined): SQL | undefined =>
  values?.length ? or(sql`${column} in ${values}`, values.includes(UNSTATED) ? isNull(column) : undefined) : undefined;

const oneOf = (dimension: Dimension, values: string[] | undefined) => isOneOf(FACT_COLUMNS[dimension], values);

/** The rows of the facts view that a scope means; undefined parts do not narrow. */
export const inScope = (scope: Scope): SQL | undefined =>
  and(
    scope.from ? gte(f.recoveredOn, firstDay(scope.from)) : undefined,
    scope.to ? lt(f.recoveredOn, dayAfter(scope.to)) : undefined,
    oneOf('refrigerant', scope.refrigerant),
    oneOf('technician', scope.technician),
    oneOf('site', scope.site),
    oneOf('branch', scope.branch),
    oneOf('category', scope.category),
    oneOf('jobType', scope.jobType),
  );
