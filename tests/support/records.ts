import { randomUUID } from 'node:crypto';
import { type CompanyScope, type Tx, withCompany } from '@/db/client';
import { appliances, branches, sites, technicians } from '@/db/schema/places';
import { recoveries } from '@/db/schema/recoveries';
import type { ApplianceCategory, JobType } from '@/lib/vocabulary';

type RecoveryRow = typeof recoveries.$inferInsert;

/** What a record says that a test does not speak of. */
const PLAIN = {
  recoveredOn: '2025-06-15',
  refrigerant: 'R-410A',
  nameplateChargeKg: '5',
  recoveredMassKg: '4',
  massUnit: 'kg',
} as const satisfies Partial<RecoveryRow>;

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
export const recoveryRow = (companyId: string, places: Places, row: Partial<RecoveryRow> = {}): RecoveryRow => ({
  ...PLAIN,
  companyId,
  recordRef: randomUUID(),
  technicianId: places.technicianIds[0] ?? '',
  siteId: places.units[0]?.siteId ?? '',
  applianceId: places.units[0]?.applianceId ?? '',
  ...row,
});

/** What a test says about a record; names are made on the way, everything else has a plain value. */
export type TestRecord = {
  on: string;
  /** Decimal kilograms as text, so that sums can be worked out exactly. */
  kg: string;
  chargeKg?: string;
  refrigerant?: string;
  technician?: string;
  site?: string;
  appliance?: string;
  branch?: string | null;
  category?: ApplianceCategory | null;
  jobType?: JobType | null;
  excluded?: boolean;
  holdMinutes?: number;
  /** Final vacuum as decimal kPa absolute. */
  vacuumKpaAbs?: string;
  ref?: string;
};

type Named = typeof technicians | typeof sites | typeof branches;

/** Writes records with the places and people they name, all in one transaction. Gives the ids by record_ref. */
export const writeRecords = (scope: CompanyScope, records: readonly TestRecord[]): Promise<Map<string, string>> =>
  withCompany(scope, async (tx) => {
    const { companyId } = scope;
    const idsOf = async (table: Named, names: (string | null | undefined)[]) => {
      const wanted = [...new Set(names)].filter((name) => typeof name === 'string');
      if (wanted.length)
        await tx
          .insert(table)
          .values(wanted.map((name) => ({ companyId, name })))
          .onConflictDoNothing();
      const rows = await tx.select({ id: table.id, name: table.name }).from(table);
      return (name: string) => rows.find((row) => row.name === name)?.id ?? '';
    };
    const full = records.map((record, index) => ({
      technician: 'Tess Ward',
      site: 'North Yard',
      appliance: 'RTU-1',
      branch: null,
      refrigerant: PLAIN.refrigerant,
      chargeKg: '10',
      ref: `${record.on}/${index}/${randomUUID()}`,
      ...record,
    }));
    const technicianId = await idsOf(
      technicians,
      full.map((r) => r.technician),
    );
    const siteId = await idsOf(
      sites,
      full.map((r) => r.site),
    );
    const branchId = await idsOf(
      branches,
      full.map((r) => r.branch),
    );
    const units = new Map(full.map((r) => [`${r.site}/${r.appliance}`, r]));
    await tx
      .insert(appliances)
      .values([...units.values()].map((r) => ({ companyId, name: r.appliance, siteId: siteId(r.site) })))
      .onConflictDoNothing();
    const allUnits = await tx
      .select({ id: appliances.id, name: appliances.name, siteId: appliances.siteId })
      .from(appliances);
    const written = await tx
      .insert(recoveries)
      .values(
        full.map((r) => ({
          ...PLAIN,
          companyId,
          recordRef: r.ref,
          recoveredOn: r.on,
          technicianId: technicianId(r.technician),
          siteId: siteId(r.site),
          applianceId: allUnits.find((unit) => unit.name === r.appliance && unit.siteId === siteId(r.site))?.id ?? '',
          branchId: r.branch ? branchId(r.branch) : null,
          category: r.category ?? null,
          jobType: r.jobType ?? null,
          refrigerant: r.refrigerant,
          nameplateChargeKg: r.chargeKg,
          recoveredMassKg: r.kg,
          holdMinutes: r.holdMinutes ?? null,
          finalVacuumKpaAbs: r.vacuumKpaAbs ?? null,
          exclusion: r.excluded ? ('entry_error' as const) : null,
        })),
      )
      .returning({ id: recoveries.id, ref: recoveries.recordRef });
    return new Map(written.map(({ id, ref }) => [ref, id]));
  });
