import 'server-only';
import { and, desc, eq, gte, lt, sql } from 'drizzle-orm';
import { dayAfter, firstDay } from '@/analytics/scope';
import type { Tx } from '@/db/client';
import { chargeAdditions as a } from '@/db/schema/charge-additions';
import { appliances, sites } from '@/db/schema/places';
import { whoTheyAre } from '@/lib/recoveries/who';
import { kgToGram } from '@/lib/units';
import type { Addition, AdditionsList, AdditionsQuery } from './contract';

const USUAL_PAGE = 200;

const columns = {
  id: a.id,
  additionRef: a.additionRef,
  appliance: appliances.name,
  applianceId: a.applianceId,
  site: sites.name,
  siteId: appliances.siteId,
  addedOn: a.addedOn,
  addedCharge: sql<number>`${a.addedChargeKg}`.mapWith(Number),
  enteredMass: a.enteredMass,
  massUnit: a.massUnit,
  reason: a.reason,
  leaksVerifiedOn: a.leaksVerifiedOn,
  notes: a.notes,
  importId: a.importId,
  writtenBy: a.createdBy,
  version: a.version,
};

const select = (tx: Tx) =>
  tx
    .select(columns)
    .from(a)
    .innerJoin(appliances, and(eq(appliances.companyId, a.companyId), eq(appliances.id, a.applianceId)))
    .innerJoin(sites, and(eq(sites.companyId, a.companyId), eq(sites.id, appliances.siteId)))
    .$dynamic();

type Row = Awaited<ReturnType<typeof select>>[number];

const named = async (tx: Tx, rows: Row[]): Promise<Addition[]> => {
  const nameOf = await whoTheyAre(
    tx,
    rows.map(({ writtenBy }) => writtenBy),
  );
  return rows.map((row) => ({
    ...row,
    addedCharge: kgToGram(row.addedCharge),
    writtenBy: nameOf(row.writtenBy),
  }));
};

/** Charge additions of a period, of an appliance or of a site, the newest first, page by page. */
export const getAdditions = async (tx: Tx, query: AdditionsQuery): Promise<AdditionsList> => {
  const { from, to, appliance, site, cursor, limit = USUAL_PAGE } = query;
  const [lastDay, lastId] = cursor?.split('_') ?? [];
  const rows = await select(tx)
    .where(
      and(
        from ? gte(a.addedOn, firstDay(from)) : undefined,
        to ? lt(a.addedOn, dayAfter(to)) : undefined,
        appliance ? eq(a.applianceId, appliance) : undefined,
        site ? eq(appliances.siteId, site) : undefined,
        lastDay ? sql`(${a.addedOn}, ${a.id}) < (${lastDay}::date, ${lastId}::uuid)` : undefined,
      ),
    )
    .orderBy(desc(a.addedOn), desc(a.id))
    .limit(limit + 1);
  const page = rows.slice(0, limit);
  const last = page.at(-1);
  return {
    items: await named(tx, page),
    nextCursor: rows.length > limit && last ? `${last.addedOn}_${last.id}` : null,
  };
};

/** One addition; undefined when the company has none with this id. */
export const getAddition = async (tx: Tx, id: string): Promise<Addition | undefined> => {
  const [addition] = await named(tx, await select(tx).where(eq(a.id, id)));
  return addition;
};
