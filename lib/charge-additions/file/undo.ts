import 'server-only';
import { and, desc, eq } from 'drizzle-orm';
import { type Tx, withCompany } from '@/db/client';
import { chargeAdditions as a, additionImports as i } from '@/db/schema/charge-additions';
import { scopeOf, type Viewer } from '@/lib/auth/viewer';
import { conflict, notFound } from '@/lib/errors';
import { whoTheyAre } from '@/lib/recoveries/who';
import { contentHash } from './content-hash';
import type { AdditionImportList, AdditionUndo } from './contract';
import { type Ledger, ledgerSchema } from './ledger';

const MOST_IMPORTS = 100;

/** Files of additions that were taken in, the newest first. */
export const listAdditionImports = async (tx: Tx): Promise<AdditionImportList> => {
  const rows = await tx.select().from(i).orderBy(desc(i.createdAt)).limit(MOST_IMPORTS);
  const nameOf = await whoTheyAre(
    tx,
    rows.map(({ createdBy }) => createdBy),
  );
  const iso = (instant: string) => new Date(instant).toISOString();
  return {
    items: rows.map(({ id, fileName, rowsRead, added, updated, unchanged, rejected, ...row }) => ({
      ...{ id, fileName, rowsRead, added, updated, unchanged, rejected },
      createdBy: nameOf(row.createdBy),
      createdAt: iso(row.createdAt),
      undoneAt: row.undoneAt && iso(row.undoneAt),
    })),
  };
};

const takeBack = async (tx: Tx, viewer: Viewer, entry: Ledger[number]): Promise<'removed' | 'restored' | string> => {
  const ofId = and(eq(a.companyId, viewer.companyId), eq(a.id, entry.additionId));
  const [now] = await tx.select().from(a).where(ofId).for('update');
  if (!now) return 'It was taken away since.';
  if (contentHash(now) !== entry.hashAfter) return 'It was changed since.';
  if (entry.before) await tx.update(a).set(entry.before).where(ofId);
  else await tx.delete(a).where(ofId);
  return entry.before ? 'restored' : 'removed';
};

/**
 * Takes a file of additions back: those it added go, those it changed get their former values, those changed since are
 * kept and listed. The history keeps all of it. Throws 404 when there is no such import, 409 when it is undone already.
 */
export const undoAdditionImport = (viewer: Viewer, id: string): Promise<AdditionUndo> =>
  withCompany(scopeOf(viewer, `undo of import ${id}`), async (tx) => {
    const ofImport = and(eq(i.companyId, viewer.companyId), eq(i.id, id));
    const [known] = await tx.select().from(i).where(ofImport).for('update');
    if (!known) throw notFound('This import');
    if (known.undoneAt) throw conflict('This import has been undone already.');
    const undo: AdditionUndo = { id, removed: 0, restored: 0, kept: [] };
    for (const entry of ledgerSchema.parse(known.ledger)) {
      const outcome = await takeBack(tx, viewer, entry);
      if (outcome === 'removed' || outcome === 'restored') undo[outcome] += 1;
      else undo.kept.push({ additionRef: entry.additionRef, reason: outcome });
    }
    await tx.update(i).set({ undoneAt: new Date().toISOString() }).where(ofImport);
    return undo;
  });
