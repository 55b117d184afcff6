import 'server-only';
import { and, eq, type SQL, sql } from 'drizzle-orm';
import type { Tx } from '@/db/client';
import { appliances, branches, cylinders, sites, technicians } from '@/db/schema/places';
import { badInput, type FieldError } from '@/lib/errors';
import type { RecoveryRow } from '@/lib/imports/rows';
import type { RecordField } from './fields';

type NamedTable = typeof branches | typeof technicians | typeof sites | typeof appliances | typeof cylinders;

/** The ids that a record's names stand for. */
export type NameIds = {
  technicianId: string;
  siteId: string;
  applianceId: string;
  branchId: string | null;
  cylinderId: string | null;
};

/** The key of a name, made by the expression of the generated column `name_key`. */
export const nameKey = (name: string): SQL =>
  sql`lower(btrim(regexp_replace(normalize(${name}, NFC), '[[:space:]]+', ' ', 'g')))`;

const find = async (tx: Tx, table: NamedTable, name: string, within?: SQL): Promise<string | null> => {
  const [row] = await tx
    .select({ id: table.id })
    .from(table)
    .where(and(eq(table.nameKey, nameKey(name)), within));
  return row?.id ?? null;
};

/**
 * The ids of a record's names. Unknown names are created when `createNames` says that they are meant; otherwise throws
 * 400 with every unknown name at its field.
 */
export const resolveNames = async (
  tx: Tx,
  companyId: string,
  row: RecoveryRow,
  createNames: boolean,
): Promise<NameIds> => {
  const unknown: FieldError[] = [];
  const idOf = async (
    field: RecordField,
    table: NamedTable,
    name: string,
    create: () => Promise<unknown>,
    within?: SQL,
  ): Promise<string> => {
    const known = await find(tx, table, name, within);
    if (known) return known;
    if (!createNames) {
      unknown.push({
        path: field,
        message: `“${name}” is not known yet. Check the spelling, or confirm that it is new`,
      });
      return '';
    }
    await create();
    return (await find(tx, table, name, within)) ?? '';
  };
  const { branch, technician, site, appliance, cylinder, refrigerant } = row;
  const branchId = branch
    ? await idOf('branch', branches, branch, () =>
        tx.insert(branches).values({ companyId, name: branch }).onConflictDoNothing(),
      )
    : null;
  const technicianId = await idOf('technician', technicians, technician, () =>
    tx
      .insert(technicians)
      .values({ companyId, name: technician, branchId: branchId || null })
      .onConflictDoNothing(),
  );
  const siteId = await idOf('site', sites, site, () =>
    tx
      .insert(sites)
      .values({ companyId, name: site, branchId: branchId || null })
      .onConflictDoNothing(),
  );
  const applianceId = siteId
    ? await idOf(
        'appliance',
        appliances,
        appliance,
        () =>
          tx
            .insert(appliances)
            .values({
              companyId,
              siteId,
              name: appliance,
              refrigerant,
              category: row.category,
              nameplateChargeKg: row.nameplateChargeKg,
              manufacturedOn: row.manufacturedOn,
            })
            .onConflictDoNothing(),
        eq(appliances.siteId, siteId),
      )
    : '';
  const cylinderId = cylinder
    ? await idOf('cylinder', cylinders, cylinder, () =>
        tx.insert(cylinders).values({ companyId, name: cylinder, refrigerant }).onConflictDoNothing(),
      )
    : null;
  if (unknown.length) throw badInput(unknown);
  return { technicianId, siteId, applianceId, branchId, cylinderId };
};
