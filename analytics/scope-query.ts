import 'server-only';
import { and, gte, inArray, isNull, lt, or, type SQL } from 'drizzle-orm';
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

const oneOf = (dimension: Dimension, values: string[] | undefined): SQL | undefined => {
  if (!values?.length) return undefined;
  const column = FACT_COLUMNS[dimension] as typeof f.refrigerant;
  const stated = values.filter((value) => value !== UNSTATED);
  return or(
    stated.length ? inArray(column, stated) : undefined,
    values.includes(UNSTATED) ? isNull(column) : undefined,
  );
};

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
