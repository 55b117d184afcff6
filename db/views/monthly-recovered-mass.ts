import { and, eq, isNull, type SQL, sql } from 'drizzle-orm';
import { type PgColumn, pgView, type QueryBuilder } from 'drizzle-orm/pg-core';
import { branches, sites, technicians } from '@/db/schema/places';
import { recoveries as r } from '@/db/schema/recoveries';
import { refrigerants } from '@/db/schema/refrigerants';

/**
 * Recovered mass by month and one dimension. Entry errors are left out; `key` is NULL where a record does not state the
 * dimension. Total yield is the ratio of the two sums, median yield the middle one of the records.
 */
const monthColumns = (key: SQL | PgColumn) => ({
  companyId: r.companyId,
  month: r.recoveredMonth,
  key: sql<string | null>`${key}`.as('key'),
  recoveredMassKg: sql<number>`sum(${r.recoveredMassKg})`.mapWith(Number).as('recovered_mass_kg'),
  fullChargeKg: sql<number>`sum(${r.fullChargeKg})`.mapWith(Number).as('full_charge_kg'),
  recoveries: sql<number>`count(*)`.mapWith(Number).as('recoveries'),
  medianYield: sql<number>`percentile_cont(0.5) within group (order by ${r.recoveryYield})`
    .mapWith(Number)
    .as('median_yield'),
  co2eKg: sql<number>`sum(${r.recoveredMassKg}::double precision * ${refrigerants.gwpAr4})`
    .mapWith(Number)
    .as('co2e_kg'),
});

const byColumn = (column: PgColumn) => (qb: QueryBuilder) =>
  qb
    .select(monthColumns(column))
    .from(r)
    .innerJoin(refrigerants, eq(refrigerants.designation, r.refrigerant))
    .where(isNull(r.exclusion))
    .groupBy(r.companyId, r.recoveredMonth, sql`3`);

const byName = (table: typeof technicians | typeof sites | typeof branches, id: PgColumn) => (qb: QueryBuilder) =>
  qb
    .select(monthColumns(table.name))
    .from(r)
    .innerJoin(refrigerants, eq(refrigerants.designation, r.refrigerant))
    .leftJoin(table, and(eq(table.companyId, r.companyId), eq(table.id, id)))
    .where(isNull(r.exclusion))
    .groupBy(r.companyId, r.recoveredMonth, sql`3`);

const monthlyView = (dimension: string) =>
  pgView(`monthly_recovered_mass_by_${dimension}`).with({ securityInvoker: true });

export const monthlyRecoveredMassByRefrigerant = monthlyView('refrigerant').as(byColumn(r.refrigerant));
export const monthlyRecoveredMassByCategory = monthlyView('category').as(byColumn(r.category));
export const monthlyRecoveredMassByJobType = monthlyView('job_type').as(byColumn(r.jobType));
export const monthlyRecoveredMassByTechnician = monthlyView('technician').as(byName(technicians, r.technicianId));
export const monthlyRecoveredMassBySite = monthlyView('site').as(byName(sites, r.siteId));
export const monthlyRecoveredMassByBranch = monthlyView('branch').as(byName(branches, r.branchId));
