import 'server-only';
import { and, eq, gte, inArray, isNotNull, isNull, lt, or, type SQL, sql } from 'drizzle-orm';
import { unionAll } from 'drizzle-orm/pg-core';
import { toGram } from '@/analytics/fact-figures';
import { keyOf, MONTHLY_VIEWS } from '@/analytics/monthly-trends/rows';
import { type Dimension, isNarrowed, type Scope } from '@/analytics/scope';
import { FACT_COLUMNS, inScope } from '@/analytics/scope-query';
import type { Tx } from '@/db/client';
import { refrigerants } from '@/db/schema/refrigerants';
import { monthlyRecoveredMassByRefrigerant as gas, monthlyRecoveredMass as v } from '@/db/views/monthly-recovered-mass';
import { recoveryFacts as f } from '@/db/views/recovery-facts';
import type { Side, Span } from './periods';

/** What of a side stands ready as months, and which records say the rest. */
type Sources = { months: string[]; records: SQL | undefined };

/** Records of a scope's dimensions on the days of some spans. */
export const onDays = (scope: Scope, spans: readonly Span[]): SQL | undefined =>
  and(
    inScope({ ...scope, from: undefined, to: undefined }),
    or(...spans.map(({ from, until }) => and(gte(f.recoveredOn, from), lt(f.recoveredOn, until)))) ?? sql`false`,
  );

/** Whole months are read where they stand ready, as long as nothing narrows the scope. */
export const sourcesOf = (scope: Scope, side: Side): Sources => {
  return isNarrowed(scope)
    ? { months: [], records: onDays(scope, side.spans) }
    : { months: side.wholeMonths.map((month) => `${month}-01`), records: onDays(scope, side.parts) };
};

const counted = (records: SQL | undefined) => and(records, isNull(f.exclusion));
const total = (column: SQL | SQL.Aliased): SQL => sql`coalesce(sum(${column}), 0)`;
const whole = (column: SQL | SQL.Aliased): SQL<number> => sql<number>`${total(column)}`.mapWith(Number);

/** Masses, charges and counts of a side; months and records are added up exactly and rounded once. */
export const sumFigures = async (tx: Tx, { months, records }: Sources) => {
  const ofRecords = (filter: SQL | undefined) => sql<number>`count(*) filter (where ${filter})`.mapWith(Number);
  const parts = unionAll(
    tx
      .select({
        mass: sql<string>`${v.recoveredMassKg}`.as('mass'),
        charge: sql<string>`${v.fullChargeKg}`.as('charge'),
        recoveries: sql<number>`${v.recoveries}`.as('recoveries'),
        holdStated: sql<number>`${v.holdStated}`.as('hold_stated'),
        held: sql<number>`${v.held}`.as('held'),
        vacuumStated: sql<number>`${v.vacuumStated}`.as('vacuum_stated'),
        downToLevel: sql<number>`${v.downToLevel}`.as('down_to_level'),
      })
      .from(v)
      .where(inArray(v.month, months)),
    tx
      .select({
        mass: sql<string>`sum(${f.recoveredMassKg})`.as('mass'),
        charge: sql<string>`sum(${f.fullChargeKg})`.as('charge'),
        recoveries: ofRecords(sql`true`).as('recoveries'),
        holdStated: ofRecords(isNotNull(f.held)).as('hold_stated'),
        held: ofRecords(sql`${f.held}`).as('held'),
        vacuumStated: ofRecords(isNotNull(f.downToLevel)).as('vacuum_stated'),
        downToLevel: ofRecords(sql`${f.downToLevel}`).as('down_to_level'),
      })
      .from(f)
      .where(counted(records)),
  ).as('parts');
  const [sums] = await tx
    .select({
      recoveredMass: toGram(total(parts.mass)),
      totalYield: sql<number | null>`(sum(${parts.mass}) / nullif(sum(${parts.charge}), 0))::double precision`,
      recoveries: whole(parts.recoveries),
      holdStated: whole(parts.holdStated),
      held: whole(parts.held),
      vacuumStated: whole(parts.vacuumStated),
      downToLevel: whole(parts.downToLevel),
    })
    .from(parts);
  if (!sums) throw new Error('A sum without groups has one row');
  return sums;
};

const GWP = { ar4: refrigerants.gwpAr4, ar6: refrigerants.gwpAr6 } as const;
const FACT_CO2E = { ar4: f.co2eKg, ar6: f.co2eAr6Kg } as const;

/** CO2-equivalent of a side by one report's GWP, kg, and the mass of refrigerants that it has none for. */
export const sumCo2e = async (tx: Tx, { months, records }: Sources, source: keyof typeof GWP) => {
  const parts = unionAll(
    tx
      .select({
        mass: sql<string>`${gas.recoveredMassKg}`.as('mass'),
        co2e: sql<number | null>`${gas.recoveredMassKg}::double precision * ${GWP[source]}`.as('co2e'),
      })
      .from(gas)
      .leftJoin(refrigerants, eq(refrigerants.designation, gas.key))
      .where(inArray(gas.month, months)),
    tx
      .select({
        mass: sql<string>`${f.recoveredMassKg}`.as('mass'),
        co2e: sql<number | null>`${FACT_CO2E[source]}`.as('co2e'),
      })
      .from(f)
      .where(counted(records)),
  ).as('parts');
  const [sums] = await tx
    .select({
      co2e: toGram(total(parts.co2e)),
      massWithoutGwp: toGram(sql`coalesce(sum(${parts.mass}) filter (where ${parts.co2e} is null), 0)`),
    })
    .from(parts);
  if (!sums) throw new Error('A sum without groups has one row');
  return sums;
};

/** Recovered mass of a side by key of a dimension, kg. */
export const sumKeys = async (tx: Tx, { months, records }: Sources, by: Dimension): Promise<Map<string, number>> => {
  const view = MONTHLY_VIEWS[by];
  const parts = unionAll(
    tx
      .select({ key: keyOf(view.key).as('part_key'), mass: sql<string>`${view.recoveredMassKg}`.as('mass') })
      .from(view)
      .where(inArray(view.month, months)),
    tx
      .select({ key: keyOf(FACT_COLUMNS[by]).as('part_key'), mass: sql<string>`${f.recoveredMassKg}`.as('mass') })
      .from(f)
      .where(counted(records)),
  ).as('parts');
  const rows = await tx
    .select({ key: parts.key, mass: toGram(total(parts.mass)) })
    .from(parts)
    .groupBy(parts.key);
  return new Map(rows.map(({ key, mass }) => [key, mass]));
};
