import { randomUUID } from 'node:crypto';
import type { Tx } from '@/db/client';
import { appliances, branches, sites, technicians } from '@/db/schema/places';
import type { recoveries } from '@/db/schema/recoveries';

/** A small crew with its places, for suites that write records directly. */
export const newPlaces = async (tx: Tx, companyId: string) => {
  const place = (name: string) => ({ companyId, id: randomUUID(), name });
  const north = place('North');
  const south = place('South');
  const crew = [place('Ada Moss'), place('Ben Oyelaran'), place('Cleo Frei')];
  const places = [place('Mill Street'), place('Harbour Hall')];
  const units = places.map((site) => ({ ...place('RTU-1'), siteId: site.id }));
  await tx.insert(branches).values([north, south]);
  await tx.insert(technicians).values(crew);
  await tx.insert(sites).values(places);
  await tx.insert(appliances).values(units);
  return {
    branchIds: [north.id, south.id],
    technicianIds: crew.map(({ id }) => id),
    units: units.map(({ id, siteId }) => ({ applianceId: id, siteId })),
  };
};
export type Places = Awaited<ReturnType<typeof newPlaces>>;

/** One record's row with sensible values; pass what the suite is about. */
export const recoveryRow = (
  companyId: string,
  places: Places,
  row: Partial<typeof recoveries.$inferInsert> = {},
): typeof recoveries.$inferInsert => ({
  companyId,
  recordRef: randomUUID(),
  recoveredOn: '2025-06-15',
  technicianId: places.technicianIds[0] ?? '',
  siteId: places.units[0]?.siteId ?? '',
  applianceId: places.units[0]?.applianceId ?? '',
  refrigerant: 'R-410A',
  nameplateChargeKg: '5',
  recoveredMassKg: '4',
  massUnit: 'kg',
  ...row,
});
