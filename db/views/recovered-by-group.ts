import { and, eq, sql } from 'drizzle-orm';
import { pgView, type QueryBuilder } from 'drizzle-orm/pg-core';
import { sites, technicians } from '@/db/schema/places';
import { groupSummary as g, type SUMMARY_GROUPS } from '@/db/schema/summaries';

/** Recovered mass and yields of a group over all of its records; entry errors are left out. */
const ofGroup =
  (dimension: (typeof SUMMARY_GROUPS)[number], table: typeof technicians | typeof sites) => (qb: QueryBuilder) =>
    qb
      .select({
        companyId: g.companyId,
        groupId: g.groupId,
        name: table.name,
        recoveries: g.recoveries,
        recoveredMassKg: g.recoveredMassKg,
        fullChargeKg: g.fullChargeKg,
        totalYield: sql<number>`(${g.recoveredMassKg} / ${g.fullChargeKg})`.mapWith(Number).as('total_yield'),
        medianYield: g.medianYield,
        appliances: sql<number>`${g.appliances}`.mapWith(Number).as('appliances'),
        firstRecoveredOn: g.firstRecoveredOn,
        lastRecoveredOn: g.lastRecoveredOn,
      })
      .from(g)
      .innerJoin(table, and(eq(table.companyId, g.companyId), eq(table.id, g.groupId)))
      .where(eq(g.dimension, dimension));

export const recoveredByTechnician = pgView('recovered_by_technician')
  .with({ securityInvoker: true })
  .as(ofGroup('technician', technicians));
export const recoveredBySite = pgView('recovered_by_site').with({ securityInvoker: true }).as(ofGroup('site', sites));
