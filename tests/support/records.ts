import { type CompanyScope, withCompany } from '@/db/client';
import { appliances, branches, sites, technicians } from '@/db/schema/places';
import { recoveries } from '@/db/schema/recoveries';
import type { ApplianceCategory, JobType } from '@/lib/vocabulary';

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
      refrigerant: 'R-410A',
      chargeKg: '10',
      ref: `${record.on}/${index}/${Math.random()}`,
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
          massUnit: 'kg' as const,
          holdMinutes: r.holdMinutes ?? null,
          finalVacuumKpaAbs: r.vacuumKpaAbs ?? null,
          exclusion: r.excluded ? ('entry_error' as const) : null,
        })),
      )
      .returning({ id: recoveries.id, ref: recoveries.recordRef });
    return new Map(written.map(({ id, ref }) => [ref, id]));
  });
