import { and, eq, sql } from 'drizzle-orm';
import { pgView } from 'drizzle-orm/pg-core';
import { appliances, branches, cylinders, sites, technicians } from '@/db/schema/places';
import { recoveries as r } from '@/db/schema/recoveries';
import { refrigerants } from '@/db/schema/refrigerants';

// The judgement of the monthly summary: a reading in inHg is good to about 0.1 kPa. NULL vacuum gives NULL.
const DOWN_TO_LEVEL = sql`(${r.finalVacuumKpaAbs}::double precision <= required_level_kpa_abs(${refrigerants.pressureClass}, ${r.fullChargeKg}, ${r.category}) + 0.1)`;

/**
 * One row a recovery with its names and derived figures: yield = recovered mass over full charge (40 CFR 82.152
 * "full charge"), CO2-equivalent = recovered mass times GWP (AR4). The grain that every scope can filter. Foreign keys
 * see to it that each row has its technician, site, appliance and refrigerant; they are left joins all the same, because
 * PostgreSQL leaves such a join out of a query that asks for none of its columns.
 */
export const recoveryFacts = pgView('recovery_facts')
  .with({ securityInvoker: true })
  .as((qb) =>
    qb
      .select({
        companyId: r.companyId,
        id: r.id,
        recordRef: r.recordRef,
        recoveredOn: r.recoveredOn,
        recoveredAt: r.recoveredAt,
        month: r.recoveredMonth,
        technicianId: r.technicianId,
        technician: sql<string>`${technicians.name}`.as('technician'),
        siteId: r.siteId,
        site: sql<string>`${sites.name}`.as('site'),
        applianceId: r.applianceId,
        appliance: sql<string>`${appliances.name}`.as('appliance'),
        branch: sql<string | null>`${branches.name}`.as('branch'),
        category: r.category,
        jobType: r.jobType,
        refrigerant: r.refrigerant,
        fullChargeKg: sql<number>`${r.fullChargeKg}`.mapWith(Number).as('full_charge_kg'),
        recoveredMassKg: sql<number>`${r.recoveredMassKg}`.mapWith(Number).as('recovered_mass_kg'),
        recoveryYield: r.recoveryYield,
        co2eKg: sql<number>`(${r.recoveredMassKg}::double precision * ${refrigerants.gwpAr4})`
          .mapWith(Number)
          .as('co2e_kg'),
        /** Whether the final vacuum reached the level of 40 CFR 82.156; NULL where none is stated. */
        downToLevel: sql<boolean | null>`${DOWN_TO_LEVEL}`.as('down_to_level'),
        /** Whether a hold was made; NULL where the record says nothing of one. */
        held: sql<boolean | null>`(${r.holdMinutes} > 0)`.as('held'),
        /** The same with the GWP of AR6; NULL where the catalogue has none. */
        co2eAr6Kg: sql<number | null>`(${r.recoveredMassKg}::double precision * ${refrigerants.gwpAr6})`.as(
          'co2e_ar6_kg',
        ),
        cylinder: sql<string | null>`${cylinders.name}`.as('cylinder'),
        exclusion: r.exclusion,
        importId: r.importId,
        version: r.version,
      })
      .from(r)
      .leftJoin(refrigerants, eq(refrigerants.designation, r.refrigerant))
      .leftJoin(technicians, and(eq(technicians.companyId, r.companyId), eq(technicians.id, r.technicianId)))
      .leftJoin(sites, and(eq(sites.companyId, r.companyId), eq(sites.id, r.siteId)))
      .leftJoin(appliances, and(eq(appliances.companyId, r.companyId), eq(appliances.id, r.applianceId)))
      .leftJoin(branches, and(eq(branches.companyId, r.companyId), eq(branches.id, r.branchId)))
      .leftJoin(cylinders, and(eq(cylinders.companyId, r.companyId), eq(cylinders.id, r.cylinderId))),
  );
