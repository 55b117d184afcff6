import 'server-only';
import { and, isNotNull, isNull, type SQL, type SQLWrapper, sql } from 'drizzle-orm';
import { recoveryFacts as f } from '@/db/views/recovery-facts';

/** An exact kilogram figure of SQL, rounded to the gram once, as a number. */
export const toGram = (kg: SQLWrapper): SQL<number> => sql<number>`round((${kg})::numeric, 3)`.mapWith(Number);

const counted = isNull(f.exclusion);
const whereCounted = (aggregate: SQL): SQL => sql`coalesce(${aggregate} filter (where ${counted}), 0)`;
const yieldOrNull = (value: unknown): number | null => (value === null ? null : Number(value));

/**
 * What any group of the facts view says: masses in kg to the gram, yields as shares (null when the group holds no record
 * that counts), and how many records were left out as entry errors.
 */
export const factFigures = {
  recoveredMass: toGram(whereCounted(sql`sum(${f.recoveredMassKg})`)),
  fullCharge: toGram(whereCounted(sql`sum(${f.fullChargeKg})`)),
  recoveries: sql<number>`count(*) filter (where ${counted})`.mapWith(Number),
  totalYield: sql<
    number | null
  >`sum(${f.recoveredMassKg}) filter (where ${counted}) / sum(${f.fullChargeKg}) filter (where ${counted})`.mapWith(
    yieldOrNull,
  ),
  medianYield: sql<
    number | null
  >`percentile_cont(0.5) within group (order by ${f.recoveryYield}) filter (where ${counted})`.mapWith(yieldOrNull),
  co2e: toGram(whereCounted(sql`sum(${f.co2eKg})`)),
  excluded: sql<number>`count(*) filter (where ${isNotNull(f.exclusion)})`.mapWith(Number),
};

const countWhere = (condition: SQL | undefined): SQL<number> =>
  sql<number>`count(*) filter (where ${and(counted, condition)})`.mapWith(Number);

/** How many records of a group state a hold and made one, and state a final vacuum and reached the required level. */
export const habitFigures = {
  holdStated: countWhere(isNotNull(f.held)),
  held: countWhere(sql`${f.held}`),
  vacuumStated: countWhere(isNotNull(f.downToLevel)),
  downToLevel: countWhere(sql`${f.downToLevel}`),
};
