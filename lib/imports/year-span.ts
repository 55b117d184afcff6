import type { YearSpan } from './date-text';
import type { RecoveryField } from './fields';

/** No record is older: before 1980 nobody kept recoveries. */
export const FIRST_RECOVERY_YEAR = 1980;
/** Appliances may be older than the records about them. */
export const FIRST_MANUFACTURE_YEAR = 1940;

/** The years a date of this field may lie in. */
export const yearSpanOf = (field: RecoveryField | null, today: string): YearSpan => ({
  first: field === 'manufactured_on' ? FIRST_MANUFACTURE_YEAR : FIRST_RECOVERY_YEAR,
  last: Number(today.slice(0, 4)),
});
