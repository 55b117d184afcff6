import 'server-only';
import { and, eq, type SQL, sql } from 'drizzle-orm';
import type { Tx } from '@/db/client';
import { recoveries as r } from '@/db/schema/recoveries';
import { recoveryFacts as f } from '@/db/views/recovery-facts';
import type { StoredRecord } from './stored-texts';

/** When the recovery happened, as `whenText` writes it: thousands of rows are written faster by the database. */
const whenInZone = (timeZone: string): SQL<string> => {
  const local = (instant: SQL) => sql`(${instant} at time zone ${timeZone})`;
  const here = local(sql`${r.recoveredAt}`);
  const twice = sql.join(
    ['1 hour', '-1 hour'].map((step) => sql`${local(sql`(${r.recoveredAt} + interval '${sql.raw(step)}')`)} = ${here}`),
    sql` or `,
  );
  const second = sql.raw(`'YYYY-MM-DD"T"HH24:MI:SS'`);
  return sql<string>`case when ${r.recoveredAt} is null then ${r.recoveredOn}::text
    when ${twice} then to_char(${r.recoveredAt} at time zone 'UTC', ${second}) || 'Z'
    else to_char(${here}, ${second}) end`;
};

/** Columns of a whole record with its names; `f` filters, `r` holds what the facts leave out. */
export const storedColumns = (timeZone: string) => ({
  recordRef: r.recordRef,
  recoveredWhen: whenInZone(timeZone).as('recovered_when'),
  technician: f.technician,
  site: f.site,
  appliance: f.appliance,
  branch: f.branch,
  jobType: r.jobType,
  category: r.category,
  refrigerant: r.refrigerant,
  nameplateChargeKg: r.nameplateChargeKg,
  addedChargeKg: r.addedChargeKg,
  startWeightKg: r.startWeightKg,
  endWeightKg: r.endWeightKg,
  recoveredMassKg: r.recoveredMassKg,
  massUnit: r.massUnit,
  finalVacuumKpaAbs: r.finalVacuumKpaAbs,
  vacuumUnit: r.vacuumUnit,
  holdMinutes: r.holdMinutes,
  holdRiseKpa: r.holdRiseKpa,
  cylinder: f.cylinder,
  disposition: r.disposition,
  manufacturedOn: r.manufacturedOn,
  technicianCertification: r.technicianCertification,
  notes: r.notes,
  entered: r.entered,
});

/** The facts of a record are its row of the table with the names looked up. */
export const sameRecord = and(eq(r.companyId, f.companyId), eq(r.id, f.id));

/** A whole record by its id, with its version; null when there is none that this transaction may see. */
export const getStored = async (
  tx: Tx,
  id: string,
  timeZone: string,
): Promise<{ record: StoredRecord; version: number; recoveredOn: string } | null> => {
  const [row] = await tx
    .select({ ...storedColumns(timeZone), version: r.version, recoveredOn: r.recoveredOn })
    .from(f)
    .innerJoin(r, sameRecord)
    .where(eq(f.id, id));
  if (!row) return null;
  const { version, recoveredOn, ...record } = row;
  return { record, version, recoveredOn };
};
