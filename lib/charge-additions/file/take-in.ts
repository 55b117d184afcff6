import 'server-only';
import { randomUUID } from 'node:crypto';
import { and, eq, inArray, sql } from 'drizzle-orm';
import { type Tx, withCompany } from '@/db/client';
import { chargeAdditions as a, additionImports } from '@/db/schema/charge-additions';
import { appliances, sites } from '@/db/schema/places';
import { scopeOf, type Viewer } from '@/lib/auth/viewer';
import type { Mapping } from '@/lib/imports/contract';
import type { OpenFile } from '@/lib/imports/rows';
import { todayIn } from '@/lib/recoveries/local-time';
import { contentHash } from './content-hash';
import type { AdditionImport } from './contract';
import { applianceKey, type Decided, type DecidedRow, decideRows, type KnownAddition, nameKeyOf } from './decide';
import { type Ledger, replacedSchema } from './ledger';
import { type ReadAdditions, readAdditionFile } from './read';

const BATCH = 1_000;

/** One company's files of additions take turns: two that bring the same refs would meet in the middle. */
const lockAdditions = (tx: Tx, { companyId }: Viewer) =>
  tx.execute(sql`select pg_advisory_xact_lock(hashtextextended(${`additions of ${companyId}`}, 0))`);

const applianceIds = async (tx: Tx, { rows }: ReadAdditions): Promise<ReadonlyMap<string, string>> => {
  const keys = [...new Set(rows.map(({ row }) => nameKeyOf(row.site)))];
  if (keys.length === 0) return new Map();
  const found = await tx
    .select({ id: appliances.id, appliance: appliances.name, site: sites.name })
    .from(appliances)
    .innerJoin(sites, and(eq(sites.companyId, appliances.companyId), eq(sites.id, appliances.siteId)))
    .where(inArray(sites.nameKey, keys));
  return new Map(found.map(({ id, appliance, site }) => [applianceKey(site, appliance), id]));
};

const knownAdditions = async (tx: Tx, { rows }: ReadAdditions): Promise<ReadonlyMap<string, KnownAddition>> => {
  const refs = [...new Set(rows.map(({ row }) => row.additionRef))];
  const known = new Map<string, KnownAddition>();
  for (let at = 0; at < refs.length; at += BATCH) {
    const found = await tx
      .select()
      .from(a)
      .where(inArray(a.additionRef, refs.slice(at, at + BATCH)));
    for (const addition of found) {
      const { id, additionRef, sourceHash } = addition;
      if (additionRef !== null)
        known.set(additionRef, { id, sourceHash, correctedByHand: contentHash(addition) !== sourceHash });
    }
  }
  return known;
};

const contentOf = ({ row, applianceId, sourceHash }: DecidedRow) => ({
  applianceId,
  sourceHash,
  addedOn: row.addedOn,
  addedChargeKg: row.addedChargeKg,
  massUnit: row.massUnit,
  enteredMass: row.enteredMass,
  reason: row.reason,
  leaksVerifiedOn: row.leaksVerifiedOn,
  notes: row.notes,
});

const write = async (tx: Tx, viewer: Viewer, importId: string, { added, updated }: Decided): Promise<Ledger> => {
  const { companyId, actor: createdBy } = viewer;
  const ledger: Ledger = [];
  for (let at = 0; at < added.length; at += BATCH) {
    const rows = added.slice(at, at + BATCH).map((decided) => ({
      ...{ companyId, id: randomUUID(), importId, createdBy, additionRef: decided.row.additionRef },
      ...contentOf(decided),
    }));
    await tx.insert(a).values(rows);
    for (const { id, additionRef, sourceHash } of rows)
      ledger.push({ additionId: id, additionRef, before: null, hashAfter: sourceHash });
  }
  for (const decided of updated) {
    const ofId = and(eq(a.companyId, companyId), eq(a.id, decided.id));
    const [before] = await tx.select().from(a).where(ofId).for('update');
    await tx
      .update(a)
      .set({ ...contentOf(decided), importId })
      .where(ofId);
    ledger.push({
      additionId: decided.id,
      additionRef: decided.row.additionRef,
      before: replacedSchema.parse(before),
      hashAfter: decided.sourceHash,
    });
  }
  return ledger;
};

/**
 * Takes a file of charge additions in, all or nothing but for the rows that are refused; a preview changes nothing. The
 * same ref again means the same addition, so that the same file twice changes nothing. Throws 422 and 413 as the reader.
 */
export const takeInAdditions = async (
  viewer: Viewer,
  file: { open: OpenFile; fileName: string; sha256: string },
  { told, dryRun }: { told: Mapping; dryRun: boolean },
): Promise<AdditionImport> => {
  const { fileName, sha256: fileSha256 } = file;
  const read = await readAdditionFile(file.open, told, { fileName, today: todayIn(viewer.timeZone) });
  const id = randomUUID();
  return withCompany(scopeOf(viewer, `import of ${fileName}`), async (tx) => {
    await lockAdditions(tx, viewer);
    const decided = decideRows(read.rows, await applianceIds(tx, read), await knownAdditions(tx, read));
    const refused = [...read.refused, ...decided.refused].sort((one, other) => one.line - other.line);
    const counts = {
      rowsRead: read.rows.length + read.refused.length,
      added: decided.added.length,
      updated: decided.updated.length,
      unchanged: decided.unchanged,
      rejected: refused.length,
    };
    const view = { fileName, dryRun, ...counts, headers: read.headers, refused, undoneAt: null };
    if (dryRun) return { ...view, id: null, createdAt: new Date().toISOString() };
    const ledger = await write(tx, viewer, id, decided);
    const { companyId, actor: createdBy } = viewer;
    await tx
      .insert(additionImports)
      .values({ companyId, id, fileName, fileSha256, ...counts, refused, ledger, createdBy });
    return { ...view, id, createdAt: new Date().toISOString() };
  });
};
