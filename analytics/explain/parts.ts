import 'server-only';
import { and, eq, isNotNull, isNull, lt, sql } from 'drizzle-orm';
import { factFigures, toGram } from '@/analytics/fact-figures';
import type { Figure } from '@/analytics/figures/figure';
import { countFlagged } from '@/analytics/flags/counts';
import { getJudged } from '@/analytics/like-jobs/judged';
import { LARGE_PLANT_KG } from '@/analytics/monthly-pattern/pattern';
import type { Scope } from '@/analytics/scope';
import { inScope } from '@/analytics/scope-query';
import type { Tx } from '@/db/client';
import { refrigerants } from '@/db/schema/refrigerants';
import { recoveryFacts as f } from '@/db/views/recovery-facts';
import type { ExplainParts } from './contract';

type Computed = { value: number | null; parts: ExplainParts };
type Sums = {
  recoveredMass: number;
  fullCharge: number;
  recoveries: number;
  totalYield: number | null;
  medianYield: number | null;
  co2e: number;
};

/** The two yields in the middle of those that count; PostgreSQL's percentile_cont is their mean. */
const getMiddleYields = async (tx: Tx, scope: Scope) => {
  const [middle] = await tx
    .select({
      lower: sql<number | null>`percentile_disc(0.5) within group (order by ${f.recoveryYield})`,
      upper: sql<number | null>`percentile_disc(0.5) within group (order by ${f.recoveryYield} desc)`,
    })
    .from(f)
    .where(and(inScope(scope), isNull(f.exclusion)));
  return { lower: middle?.lower ?? null, upper: middle?.upper ?? null };
};

const GWP = {
  co2e: { potential: refrigerants.gwpAr4, co2eKg: f.co2eKg },
  co2eAr6: { potential: refrigerants.gwpAr6, co2eKg: f.co2eAr6Kg },
} as const;

/** What each refrigerant adds to a CO2-equivalent; those without a potential in the report add nothing. */
const getGwpTerms = (tx: Tx, scope: Scope, measure: keyof typeof GWP) => {
  const { potential, co2eKg } = GWP[measure];
  return tx
    .select({
      refrigerant: f.refrigerant,
      recoveredMass: factFigures.recoveredMass,
      gwp: sql<number>`${potential}`.mapWith(Number),
      co2e: toGram(sql`sum(${co2eKg})`),
    })
    .from(f)
    .innerJoin(refrigerants, eq(refrigerants.designation, f.refrigerant))
    .where(and(inScope(scope), isNull(f.exclusion), isNotNull(potential)))
    .groupBy(f.refrigerant, potential)
    .orderBy(sql`sum(${co2eKg}) desc, ${f.refrigerant}`);
};

const getCo2eAr6 = async (tx: Tx, scope: Scope): Promise<number> => {
  const [row] = await tx
    .select({ co2e: toGram(sql`coalesce(sum(${f.co2eAr6Kg}), 0)`) })
    .from(f)
    .where(and(inScope(scope), isNull(f.exclusion)));
  return row?.co2e ?? 0;
};

const getAppliances = async (tx: Tx, scope: Scope): Promise<number> => {
  const [row] = await tx
    .select({ appliances: sql<number>`count(distinct ${f.applianceId})`.mapWith(Number) })
    .from(f)
    .where(and(inScope(scope), isNull(f.exclusion)));
  return row?.appliances ?? 0;
};

/** How many of the records that state a reading say yes to it. */
const getPart = async (tx: Tx, scope: Scope, reading: 'held' | 'downToLevel') => {
  const [row] = await tx
    .select({
      part: sql<number>`count(*) filter (where ${f[reading]})`.mapWith(Number),
      of: sql<number>`count(${f[reading]})`.mapWith(Number),
    })
    .from(f)
    .where(and(inScope(scope), isNull(f.exclusion)));
  const { part, of } = row ?? { part: 0, of: 0 };
  return { value: of > 0 ? part / of : null, parts: { kind: 'part' as const, part, of } };
};

const getRoutine = async (tx: Tx, scope: Scope): Promise<Computed> => {
  const { recoveredMass, recoveries } = factFigures;
  const [row] = await tx
    .select({ recoveredMass, recoveries })
    .from(f)
    .where(and(inScope(scope), lt(f.fullChargeKg, LARGE_PLANT_KG)));
  return { value: row?.recoveredMass ?? 0, parts: { kind: 'sum', recoveries: row?.recoveries ?? 0 } };
};

/** The value of a measure over a scope, with what its formula is made of. */
export const computeMeasure = async (
  tx: Tx,
  measure: Figure['measure'],
  scope: Scope,
  { recoveredMass, fullCharge, recoveries, totalYield, medianYield, co2e }: Sums,
): Promise<Computed> => {
  switch (measure) {
    case 'recoveredMass':
      return { value: recoveredMass, parts: { kind: 'sum', recoveries } };
    case 'fullCharge':
      return { value: fullCharge, parts: { kind: 'sum', recoveries } };
    case 'recoveries':
      return { value: recoveries, parts: { kind: 'count' } };
    case 'appliances':
      return { value: await getAppliances(tx, scope), parts: { kind: 'count' } };
    case 'totalYield':
      return { value: totalYield, parts: { kind: 'ratio', recoveredMass, fullCharge } };
    case 'medianYield':
      return { value: medianYield, parts: { kind: 'median', recoveries, ...(await getMiddleYields(tx, scope)) } };
    case 'co2e':
      return { value: co2e, parts: { kind: 'gwp', refrigerants: await getGwpTerms(tx, scope, measure) } };
    case 'co2eAr6': {
      const terms = await getGwpTerms(tx, scope, measure);
      return { value: await getCo2eAr6(tx, scope), parts: { kind: 'gwp', refrigerants: terms } };
    }
    case 'routineMass':
      return getRoutine(tx, scope);
    case 'heldShare':
      return getPart(tx, scope, 'held');
    case 'downToLevelShare':
      return getPart(tx, scope, 'downToLevel');
    case 'flagged':
      return { value: await countFlagged(tx, scope), parts: { kind: 'count' } };
    case 'farBelow': {
      const { records, groups, low } = await getJudged(tx, scope);
      return { value: low, parts: { kind: 'standing', judged: records, groups } };
    }
  }
};
