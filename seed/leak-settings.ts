import { and, eq, inArray, like, type SQL } from 'drizzle-orm';
import { withCompanyJob } from '@/db/client';
import { siteLeakMethods } from '@/db/schema/charge-additions';
import { appliances, sites } from '@/db/schema/places';
import type { Viewer } from '@/lib/auth/viewer';
import type { LeakRateMethod } from '@/lib/vocabulary';
import type { DemoCompany } from './company';
import type { SiteKind } from './equipment';

/** Sites at which somebody has chosen; at the others nobody has yet. */
const METHODS: Partial<Record<SiteKind, LeakRateMethod>> = { supermarket: 'annualizing', plant: 'rolling_average' };

/** Splits are of the subsector that 40 CFR 84.106 leaves out, chillers are not; of the rest nobody has said. */
const LIGHT_COMMERCIAL: readonly [names: string, is: boolean][] = [
  ['AC-%', true],
  ['CH-%', false],
];

/** Writes what the office has set up about leak rates: each site's method, and which units are light commercial. */
export const stateLeakSettings = ({ companyId, actor }: Viewer, company: DemoCompany): Promise<void> =>
  withCompanyJob({ companyId, actor }, async (tx) => {
    const chosen = company.sites.flatMap(({ name, kind }) => {
      const method = METHODS[kind];
      return method ? [{ name, method }] : [];
    });
    const names = chosen.map(({ name }) => name);
    const rows = names.length ? await tx.select().from(sites).where(inArray(sites.name, names)) : [];
    const methodOf = new Map(chosen.map(({ name, method }) => [name, method]));
    const methods = rows.flatMap(({ id: siteId, name }) => {
      const method = methodOf.get(name);
      return method ? [{ companyId, siteId, method, chosenBy: actor }] : [];
    });
    if (methods.length) await tx.insert(siteLeakMethods).values(methods);
    const named = (pattern: string): SQL | undefined =>
      and(eq(appliances.companyId, companyId), like(appliances.name, pattern));
    for (const [pattern, lightCommercial] of LIGHT_COMMERCIAL)
      await tx.update(appliances).set({ lightCommercial }).where(named(pattern));
  });
