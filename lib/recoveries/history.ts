import 'server-only';
import { and, desc, eq, inArray } from 'drizzle-orm';
import type { Tx } from '@/db/client';
import { history } from '@/db/schema/history';
import { appliances, branches, cylinders, sites, technicians } from '@/db/schema/places';
import { MASS_FIELDS, RECORD_FIELDS, type RecordTexts } from './fields';
import { type HistoryRow, historyRowSchema, historyTexts, type NameOf } from './history-row';
import { whoTheyAre } from './who';

/** One change of a record in words: what each field said before and after, in the unit of that time. */
export type RecordChange = {
  entryNo: number;
  changedAt: string;
  action: 'insert' | 'update' | 'delete';
  who: string;
  reason: string | null;
  changes: { field: string; before: string | null; after: string | null }[];
};

/** Where the ids of a record find their names. */
const NAMED = {
  technician_id: technicians,
  site_id: sites,
  appliance_id: appliances,
  branch_id: branches,
  cylinder_id: cylinders,
} as const;
const NAME_KEYS = Object.keys(NAMED) as (keyof typeof NAMED)[];

const namesIn = async (tx: Tx, rows: HistoryRow[]): Promise<NameOf> => {
  const names = new Map<string, string>();
  for (const key of NAME_KEYS) {
    const ids = [...new Set(rows.flatMap((row) => row[key] ?? []))];
    const table = NAMED[key];
    if (ids.length === 0) continue;
    const found = await tx.select({ id: table.id, name: table.name }).from(table).where(inArray(table.id, ids));
    for (const { id, name } of found) names.set(id, name);
  }
  return (id) => (id === null ? null : (names.get(id) ?? 'a name since removed'));
};

const UNIT_OF: Partial<Record<keyof RecordTexts, 'massUnit' | 'vacuumUnit'>> = {
  ...Object.fromEntries(MASS_FIELDS.map((field) => [field, 'massUnit' as const])),
  finalVacuum: 'vacuumUnit',
  holdRise: 'vacuumUnit',
};

const withUnits = (texts: RecordTexts): Record<string, string | null> =>
  Object.fromEntries(
    RECORD_FIELDS.map((field) => {
      const unit = UNIT_OF[field];
      return [field, texts[field] === '' ? null : unit ? `${texts[field]} ${texts[unit]}` : texts[field]];
    }),
  );

const differences = (before: Record<string, string | null>, after: Record<string, string | null>) =>
  [...RECORD_FIELDS, 'exclusion'].flatMap((field) => {
    const [was, is] = [before[field] ?? null, after[field] ?? null];
    return was === is ? [] : [{ field, before: was, after: is }];
  });

/** Every change of a record, newest first, with who made it and why. */
export const getHistory = async (tx: Tx, id: string, timeZone: string): Promise<RecordChange[]> => {
  const entries = await tx
    .select()
    .from(history)
    .where(and(eq(history.tableName, 'recoveries'), eq(history.rowId, id)))
    .orderBy(desc(history.entryNo));
  const parsed = entries.map((entry) => ({
    ...entry,
    before: entry.before && historyRowSchema.parse(entry.before),
    after: entry.after && historyRowSchema.parse(entry.after),
  }));
  const nameOf = await namesIn(
    tx,
    parsed.flatMap((entry) => [entry.before ?? [], entry.after ?? []].flat()),
  );
  const who = await whoTheyAre(tx, [...new Set(entries.map((entry) => entry.actor))]);
  const said = (row: HistoryRow | null): Record<string, string | null> =>
    row ? { ...withUnits(historyTexts(row, nameOf, timeZone)), exclusion: row.exclusion } : {};
  return parsed.map(({ entryNo, changedAt, action, actor, reason, before, after }) => ({
    entryNo,
    changedAt: new Date(changedAt).toISOString(),
    action,
    who: who(actor),
    reason,
    changes: differences(said(before), said(after)),
  }));
};
