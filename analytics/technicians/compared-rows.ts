import 'server-only';
import { and, eq, isNull, lt, sql } from 'drizzle-orm';
import { firstDay, type Scope } from '@/analytics/scope';
import { inScope } from '@/analytics/scope-query';
import type { ComparedRecovery } from '@/analytics/technician-comparison/recovery';
import { CATALOGUE } from '@/db/catalogue/refrigerants';
import type { Tx } from '@/db/client';
import { flags } from '@/db/schema/flags';
import { recoveries as r } from '@/db/schema/recoveries';
import { recoveryFacts as f } from '@/db/views/recovery-facts';
import { requiredLevelKpaAbs } from '@/lib/trade/evacuation-level';
import type { ApplianceCategory, JobType } from '@/lib/vocabulary';

/** Columns of the recoveries that are compared, each an array in the order of time: a tenth of the work of row objects. */
type Columns = {
  technicianIds: string[];
  places: number[];
  categories: (ApplianceCategory | null)[];
  jobTypes: (JobType | null)[];
  refrigerants: string[];
  fullChargesKg: number[];
  massesKg: number[];
  days: string[];
  vacuumsKpaAbs: (number | null)[];
  held: (boolean | null)[];
  weighedTwice: boolean[];
  writtenSameDay: (boolean | null)[];
  decisions: (0 | 1 | 2)[];
};

const CLASSES = new Map(CATALOGUE.map(({ designation, pressureClass }) => [designation, pressureClass]));

const DECIDED = [null, 'short on arrival', 'stopped early'] as const satisfies readonly ComparedRecovery['decided'][];

const toRecoveries = (columns: Columns): ComparedRecovery[] =>
  columns.places.map((place, at) => {
    const fullChargeKg = columns.fullChargesKg[at] ?? 1;
    const category = columns.categories[at] ?? null;
    const pressureClass = CLASSES.get(columns.refrigerants[at] ?? '');
    return {
      technicianId: columns.technicianIds[place - 1] ?? '',
      category,
      jobType: columns.jobTypes[at] ?? null,
      fullChargeKg,
      recoveredMassKg: columns.massesKg[at] ?? 0,
      recoveredOn: columns.days[at] ?? '',
      finalVacuumKpaAbs: columns.vacuumsKpaAbs[at] ?? null,
      requiredLevelKpaAbs: pressureClass ? requiredLevelKpaAbs(pressureClass, fullChargeKg, category) : null,
      held: columns.held[at] ?? null,
      weighedTwice: columns.weighedTwice[at] ?? false,
      writtenSameDay: columns.writtenSameDay[at] ?? null,
      decided: DECIDED[columns.decisions[at] ?? 0] ?? null,
    };
  });

const comparedQuery = (tx: Tx, scope: Scope, timeZone: string) => {
  const decided = tx
    .select({
      companyId: flags.companyId,
      recoveryId: flags.recoveryId,
      code: sql<number>`min(case when ${flags.decision} = 'incomplete_recovery' then 2 else 1 end)`.as('code'),
    })
    .from(flags)
    .where(sql`${flags.decision} in ('leaked_before', 'known_low_charge', 'incomplete_recovery')`)
    .groupBy(flags.companyId, flags.recoveryId)
    .as('decided');
  return tx
    .select({
      technicianId: sql`${f.technicianId}`.as('technician_id'),
      category: sql`${f.category}`.as('category'),
      jobType: sql`${f.jobType}`.as('job_type'),
      refrigerant: sql`${f.refrigerant}`.as('refrigerant'),
      charge: sql`${r.fullChargeKg}::double precision`.as('charge'),
      mass: sql`${r.recoveredMassKg}::double precision`.as('mass'),
      recoveredOn: sql`${f.recoveredOn}`.as('day'),
      vacuum: sql`${r.finalVacuumKpaAbs}::double precision`.as('vacuum'),
      held: sql`${r.holdMinutes} > 0`.as('held'),
      weighedTwice: sql`${r.startWeightKg} is not null and ${r.endWeightKg} is not null`.as('weighed_twice'),
      writtenSameDay:
        sql`case when ${r.importId} is null then (${r.createdAt} at time zone ${timeZone})::date = ${r.recoveredOn} end`.as(
          'same_day',
        ),
      decision: sql`coalesce(${decided.code}, 0)`.as('decision'),
    })
    .from(f)
    .innerJoin(r, and(eq(r.companyId, f.companyId), eq(r.id, f.id)))
    .leftJoin(decided, and(eq(decided.companyId, f.companyId), eq(decided.recoveryId, f.id)))
    .where(and(inScope(scope), isNull(f.exclusion)))
    .orderBy(f.recoveredOn, f.id);
};

/**
 * The recoveries that technicians are compared on, in the order of time, entry errors left out. `timeZone` is the
 * company's: it decides on which day a ticket was written.
 */
export const readComparedRecoveries = async (tx: Tx, scope: Scope, timeZone: string): Promise<ComparedRecovery[]> => {
  const all = (column: string) => sql`coalesce(json_agg(${sql.identifier(column)}), '[]'::json)`;
  const { rows } = await tx.execute<Columns>(sql`
    with compared as materialized (${comparedQuery(tx, scope, timeZone)}),
    people as (select technician_id, row_number() over (order by technician_id) as place from (select distinct technician_id from compared) ids)
    select
      (select coalesce(json_agg(technician_id order by place), '[]'::json) from people) as "technicianIds",
      coalesce(json_agg(place), '[]'::json) as places,
      ${all('category')} as categories,
      ${all('job_type')} as "jobTypes",
      ${all('refrigerant')} as refrigerants,
      ${all('charge')} as "fullChargesKg",
      ${all('mass')} as "massesKg",
      ${all('day')} as days,
      ${all('vacuum')} as "vacuumsKpaAbs",
      ${all('held')} as held,
      ${all('weighed_twice')} as "weighedTwice",
      ${all('same_day')} as "writtenSameDay",
      ${all('decision')} as decisions
    from (select compared.*, people.place from compared join people using (technician_id) order by day) ordered`);
  const [columns] = rows;
  return columns ? toRecoveries(columns) : [];
};

/** How many recoveries each technician did before the scope begins. */
export const readEarlierJobs = async (tx: Tx, scope: Scope): Promise<Map<string, number>> => {
  if (!scope.from) return new Map();
  const rows = await tx
    .select({ technicianId: r.technicianId, jobs: sql<number>`count(*)`.mapWith(Number) })
    .from(r)
    .where(lt(r.recoveredOn, firstDay(scope.from)))
    .groupBy(r.technicianId);
  return new Map(rows.map(({ technicianId, jobs }) => [technicianId, jobs]));
};
