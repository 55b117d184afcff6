import { and, eq, type SQL, sql } from 'drizzle-orm';
import { type PgColumn, pgView, type QueryBuilder } from 'drizzle-orm/pg-core';
import { type SUMMARY_DIMENSIONS, monthlySummary as s } from '@/db/schema/monthly-summary';
import { branches, sites, technicians } from '@/db/schema/places';

/**
 * Recovered mass by month and one dimension. Entry errors are left out; `key` is NULL where records do not state the
 * dimension. Total yield is the ratio of the two sums, median yield the middle one of the records. The sums stand ready
 * in monthly_summary; its trigger says how they are made.
 */
const monthColumns = (key: SQL | PgColumn) => ({
  companyId: s.companyId,
  month: s.month,
  key: sql<string | null>`${key}`.as('key'),
  recoveredMassKg: sql<number>`${s.recoveredMassKg}`.mapWith(Number).as('recovered_mass_kg'),
  fullChargeKg: sql<number>`${s.fullChargeKg}`.mapWith(Number).as('full_charge_kg'),
  recoveries: s.recoveries,
  medianYield: s.medianYield,
  co2eKg: s.co2eKg,
  vacuumStated: s.vacuumStated,
  downToLevel: s.downToLevel,
  holdStated: s.holdStated,
  held: s.held,
});

type SummaryDimension = (typeof SUMMARY_DIMENSIONS)[number];

const byWord = (dimension: SummaryDimension) => (qb: QueryBuilder) =>
  qb
    .select(monthColumns(sql`nullif(${s.key}, '')`))
    .from(s)
    .where(eq(s.dimension, dimension));

const byName =
  (dimension: SummaryDimension, table: typeof technicians | typeof sites | typeof branches) => (qb: QueryBuilder) =>
    qb
      .select(monthColumns(table.name))
      .from(s)
      .leftJoin(table, and(eq(table.companyId, s.companyId), eq(table.id, sql`nullif(${s.key}, '')::uuid`)))
      .where(eq(s.dimension, dimension));

const monthlyView = <Name extends string>(name: Name) => pgView(name).with({ securityInvoker: true });

export const monthlyRecoveredMass = monthlyView('monthly_recovered_mass').as(byWord('all'));
export const monthlyRecoveredMassByRefrigerant = monthlyView('monthly_recovered_mass_by_refrigerant').as(
  byWord('refrigerant'),
);
export const monthlyRecoveredMassByCategory = monthlyView('monthly_recovered_mass_by_category').as(byWord('category'));
export const monthlyRecoveredMassByJobType = monthlyView('monthly_recovered_mass_by_job_type').as(byWord('job_type'));
export const monthlyRecoveredMassByTechnician = monthlyView('monthly_recovered_mass_by_technician').as(
  byName('technician', technicians),
);
export const monthlyRecoveredMassBySite = monthlyView('monthly_recovered_mass_by_site').as(byName('site', sites));
export const monthlyRecoveredMassByBranch = monthlyView('monthly_recovered_mass_by_branch').as(
  byName('branch', branches),
);
