import { isNull, sql } from 'drizzle-orm';
import { pgView } from 'drizzle-orm/pg-core';
import { recoveries as r } from '@/db/schema/recoveries';

/**
 * The full charge of each appliance as most of its records state it (the smaller of equals), and its refrigerant as the
 * last one does. A plate misread once does not move it. Entry errors are left out.
 */
export const applianceCharges = pgView('appliance_charges')
  .with({ securityInvoker: true })
  .as((qb) =>
    qb
      .select({
        companyId: r.companyId,
        applianceId: r.applianceId,
        fullChargeKg: sql<number>`mode() within group (order by ${r.fullChargeKg})`
          .mapWith(Number)
          .as('full_charge_kg'),
        refrigerant: sql<string>`(array_agg(${r.refrigerant} order by ${r.recoveredOn} desc, ${r.id}))[1]`.as(
          'refrigerant',
        ),
        category: sql<string | null>`(array_agg(${r.category} order by ${r.recoveredOn} desc, ${r.id}))[1]`.as(
          'category',
        ),
      })
      .from(r)
      .where(isNull(r.exclusion))
      .groupBy(r.companyId, r.applianceId),
  );
