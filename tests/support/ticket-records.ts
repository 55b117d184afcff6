import { withCompany } from '@/db/client';
import { appliances, branches, cylinders, sites, technicians } from '@/db/schema/places';
import { recoveries } from '@/db/schema/recoveries';

type NewRecovery = Omit<typeof recoveries.$inferInsert, 'companyId' | 'technicianId' | 'siteId' | 'applianceId'>;

/** One name of each kind in a company, and a writer of records under them that takes only what a test is about. */
export const newPlaces = (scope: { companyId: string; actor: string }) =>
  withCompany(scope, async (tx) => {
    const { companyId } = scope;
    const id = (rows: { id: string }[]) => rows[0]?.id ?? '';
    const named = (name: string) => ({ companyId, name });
    const technicianId = id(await tx.insert(technicians).values(named('Robin Vale')).returning());
    const otherTechnicianId = id(await tx.insert(technicians).values(named('Kim Arden')).returning());
    const branchId = id(await tx.insert(branches).values(named('North')).returning());
    const siteId = id(await tx.insert(sites).values(named('Mill Street School')).returning());
    const applianceId = id(
      await tx
        .insert(appliances)
        .values({ ...named('RTU-1'), siteId })
        .returning(),
    );
    const cylinderId = id(await tx.insert(cylinders).values(named('C-100')).returning());
    const places = { technicianId, siteId, applianceId };
    return { ...places, otherTechnicianId, branchId, cylinderId };
  });
export type Places = Awaited<ReturnType<typeof newPlaces>>;

/** Writes records with 5 kg of R-410A out of 10 kg unless told otherwise; gives their ids in order. */
export const addRecoveries = async (
  scope: { companyId: string; actor: string },
  places: Places,
  records: Partial<typeof recoveries.$inferInsert>[],
): Promise<string[]> => {
  const { technicianId, siteId, applianceId } = places;
  const usual: NewRecovery = {
    recordRef: '',
    recoveredOn: '2026-03-10',
    refrigerant: 'R-410A',
    nameplateChargeKg: '10',
    recoveredMassKg: '5',
    massUnit: 'kg',
  };
  const rows = records.map((record, index) => ({
    ...usual,
    recordRef: `T-${index + 1}`,
    ...{ companyId: scope.companyId, technicianId, siteId, applianceId },
    ...record,
  }));
  const written = await withCompany(scope, (tx) => tx.insert(recoveries).values(rows).returning({ id: recoveries.id }));
  return written.map(({ id }) => id);
};
