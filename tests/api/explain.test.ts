import fc from 'fast-check';
import { beforeAll, expect, test } from 'vitest';
import { DIMENSIONS, UNSTATED } from '@/analytics/dimensions';
import type { Explained } from '@/analytics/explain/contract';
import { type Figure, type FigureScope, figureRecords, monthInScope } from '@/analytics/figures/figure';
import { MEASURES, type Measure } from '@/analytics/figures/measures';
import type { FlagsList } from '@/analytics/flags/contract';
import type { RecordList, RecordRow } from '@/analytics/records/contract';
import { EVERY_RECORD, onlyOf, scopeQuery } from '@/analytics/scope-address';
import type { TrendsComparison } from '@/analytics/trends-comparison/contract';
import { GET as appliancesRoute } from '@/app/api/appliances/route';
import { GET as explainRoute } from '@/app/api/explain/route';
import { GET as flagsRoute } from '@/app/api/flags/route';
import { GET as recordsRoute } from '@/app/api/recoveries/route';
import { GET as sitesRoute } from '@/app/api/sites/route';
import { GET as techniciansRoute } from '@/app/api/technicians/route';
import { GET as comparisonRoute } from '@/app/api/trends/comparison/route';
import { GET as trendsRoute } from '@/app/api/trends/monthly/route';
import { searchString } from '@/lib/api/client';
import { asRole } from '../support/as-role';
import { apiRequest, newCompany } from '../support/company';
import { putFlags, type TestFlag } from '../support/flags';
import { randomRecords } from '../support/random-records';
import { randomScopes } from '../support/random-scopes';
import { writeRecords } from '../support/records';

const RUNS = 700;
const company = await newCompany();
let owner = '';

type Route = (request: Request, context: never) => Promise<Response>;
// Each route answers by its contract, which its own test checks.
const ask = async <Answer>(route: Route, address: string, token = owner): Promise<Answer> => {
  const response = await route(apiRequest(address, token), undefined as never);
  expect(response.status, address).toBe(200);
  return (await response.json()) as Answer;
};
const explained = ({ measure, scope }: Figure, token = owner) =>
  ask<Explained>(explainRoute, `/api/explain${searchString({ ...scopeQuery(scope), measure })}`, token);

beforeAll(async () => {
  owner = await company.token('owner');
  const records = randomRecords(360, 20_261_201);
  const ids = await writeRecords(company.scope, records);
  const counted = records.flatMap(({ ref, excluded }) => (excluded || !ref ? [] : [ids.get(ref) ?? '']));
  // Every fourth has a flag that counts; the next one flags that do not: too unsure, or no fault.
  await putFlags(
    company.companyId,
    counted.flatMap((recoveryId, index): TestFlag[] => {
      if (index % 4 === 0) return [{ recoveryId, rule: 'stopped_early', certainty: 0.5 + (index % 5) / 10 }];
      return index % 4 === 1
        ? [
            { recoveryId, rule: 'hold_missing', certainty: 0.49 },
            { recoveryId, rule: 'short_on_arrival', certainty: 0.9 },
          ]
        : [];
    }),
  );
  await asRole('owner', {}, (client) => client.query('analyze recoveries'));
});

const sumGrams = (rows: RecordRow[], of: 'recoveredMass' | 'fullCharge') =>
  rows.reduce((sum, row) => sum + Math.round(row[of] * 1000), 0);
const middleOf = (rows: RecordRow[]): number | null => {
  const yields = rows.map((row) => row.yield).sort((a, b) => a - b);
  const half = (yields.length - 1) / 2;
  const [lower, upper] = [yields[Math.floor(half)], yields[Math.ceil(half)]];
  return lower === undefined || upper === undefined ? null : (lower + upper) / 2;
};

/** The value of a measure worked out by hand from the records that the list gave. */
const byHand = (measure: Measure, rows: RecordRow[], { parts }: Explained): number | null => {
  switch (measure) {
    case 'recoveredMass':
    case 'fullCharge':
      return sumGrams(rows, measure) / 1000;
    case 'routineMass':
      return sumGrams(rows, 'recoveredMass') / 1000;
    case 'totalYield':
      return rows.length ? sumGrams(rows, 'recoveredMass') / sumGrams(rows, 'fullCharge') : null;
    case 'medianYield':
      return middleOf(rows);
    case 'appliances':
      return new Set(rows.map((row) => `${row.site} ${row.appliance}`)).size;
    case 'co2e':
    case 'co2eAr6': {
      const gwps = new Map(parts.kind === 'gwp' ? parts.refrigerants.map((one) => [one.refrigerant, one.gwp]) : []);
      // AR4 has a potential for every refrigerant of the records, AR6 not.
      const missing = measure === 'co2e' ? Number.NaN : 0;
      return rows.reduce((sum, row) => sum + row.recoveredMass * (gwps.get(row.refrigerant) ?? missing), 0);
    }
    case 'heldShare':
    case 'downToLevelShare':
      // The list does not say what the records state; that it has as many of them is checked by count.
      return parts.kind === 'part' && parts.of > 0 ? parts.part / rows.length : null;
    default:
      return rows.length;
  }
};

/** How far two computations of a measure may lie apart: a CO2-equivalent, not exact itself, by the half gram of its rounding. */
const within = (measure: Measure): number => {
  if (measure === 'co2e' || measure === 'co2eAr6') return 0.000501;
  return measure === 'totalYield' || measure === 'medianYield' ? 1e-12 : 0;
};
const same = (measure: Measure, actual: number | null, expected: number | null, what: string) => {
  if (actual === null || expected === null) expect(actual, what).toBe(expected);
  else expect(Math.abs(actual - expected), `${what}: ${actual}, not ${expected}`).toBeLessThanOrEqual(within(measure));
};

/** An address in parts, whatever their order. */
const partsOf = (address: string): string[] => address.split(/[?&]/).sort();

/** A figure as the screen has it is what the explanation says and what the records behind it come to. */
const agrees = async (figure: Figure, shown: number | null) => {
  const answer = await explained(figure);
  const what = `${figure.measure} of ${JSON.stringify(scopeQuery(figure.scope))}`;
  same(figure.measure, answer.value, shown, `${what}, explained`);
  expect(partsOf(answer.records)).toEqual(partsOf(`/api/recoveries${searchString(figureRecords(figure))}`));
  const list = await ask<RecordList>(recordsRoute, `${answer.records}&limit=500`);
  expect(list.total, what).toBe(answer.count);
  expect(list.items.length, what).toBe(answer.count);
  expect(sumGrams(list.items, 'recoveredMass'), what).toBe(Math.round(answer.sum * 1000));
  expect(list.items.every((row) => row.exclusion === null)).toBe(true);
  same(figure.measure, byHand(figure.measure, list.items, answer), shown, `${what}, by hand`);
};

type Cell = { scope: FigureScope; figures: Partial<Record<Measure, number | null>> };

type Dimension = (typeof DIMENSIONS)[number];
type Screen = (scope: FigureScope, by: Dimension) => Promise<Cell[]>;
type Habits = { held: number; holdStated: number; downToLevel: number; vacuumStated: number };
type Trends = { rows: { month: string; key: string }[]; months: ({ month: string } & Habits)[]; totals: object };

const trendsOf = (scope: FigureScope, by: Dimension) =>
  ask<Trends>(trendsRoute, `/api/trends/monthly${searchString({ ...scopeQuery(scope), by })}`);
const itemsOf = async <Item>(route: Route, path: string, scope: FigureScope) =>
  (await ask<{ items: Item[] }>(route, `${path}${searchString(scopeQuery(scope))}`)).items;
// Figures are read by the names of measures; what is no measure is not looked at.
const cell = (scope: FigureScope, figures: object): Cell => ({ scope, figures });

/** What the screens show of a scope, with the records that each figure should open. */
const SCREENS: Record<string, Screen> = {
  'trends, cells': async (scope, by) =>
    (await trendsOf(scope, by)).rows.map((row) => cell(onlyOf(monthInScope(scope, row.month), by, [row.key]), row)),
  'trends, months': async (scope, by) =>
    (await trendsOf(scope, by)).months.map((row) =>
      cell(monthInScope(scope, row.month), {
        ...row,
        heldShare: row.holdStated ? row.held / row.holdStated : null,
        downToLevelShare: row.vacuumStated ? row.downToLevel / row.vacuumStated : null,
      }),
    ),
  'trends, totals': async (scope, by) => [cell(scope, (await trendsOf(scope, by)).totals)],
  technicians: async (scope) =>
    (await itemsOf<{ technician: string }>(techniciansRoute, '/api/technicians', scope)).map((row) =>
      cell(onlyOf(scope, 'technician', [row.technician]), row),
    ),
  sites: async (scope) =>
    (await itemsOf<{ site: string; lowRecoveries: number }>(sitesRoute, '/api/sites', scope)).map((row) =>
      cell(onlyOf(scope, 'site', [row.site]), { ...row, farBelow: row.lowRecoveries }),
    ),
  appliances: async (scope) =>
    (
      await itemsOf<{ site: string; appliance: string; lowRecoveries: number }>(
        appliancesRoute,
        '/api/appliances',
        scope,
      )
    ).map((row) =>
      cell(onlyOf(onlyOf(scope, 'site', [row.site]), 'appliance', [row.appliance]), {
        ...row,
        farBelow: row.lowRecoveries,
      }),
    ),
  comparison: async (scope, by) => {
    const versus = '2025-01..2025-12';
    const of = async (gwp: 'ar4' | 'ar6') =>
      (
        await ask<TrendsComparison>(
          comparisonRoute,
          `/api/trends/comparison${searchString({ ...scopeQuery(scope), by, versus, gwp })}`,
        )
      ).comparison;
    const [ar4, ar6] = [await of('ar4'), await of('ar6')];
    return [ar4?.now, ar4?.before].flatMap((side, index) => {
      const other = index === 0 ? ar6?.now : ar6?.before;
      return side ? [cell({ ...scope, from: side.from, to: side.to }, { ...side, co2eAr6: other?.co2e })] : [];
    });
  },
  season: async (scope) => {
    const list = await ask<RecordList>(
      recordsRoute,
      `/api/recoveries${searchString({ ...scopeQuery(scope), limit: 500 })}`,
    );
    // Routine jobs have a full charge below 100 lb: 45.359 kg.
    const routine = list.items.filter((row) => row.exclusion === null && row.fullCharge < 45.3592);
    return [cell(scope, { routineMass: sumGrams(routine, 'recoveredMass') / 1000 })];
  },
  flags: async (scope) => {
    const { open } = await ask<FlagsList>(flagsRoute, `/api/flags${searchString(scopeQuery(scope))}`);
    return [cell(scope, { flagged: open.flagged })];
  },
};

test('what a screen shows, what is explained and what the records come to are one', { timeout: 600_000 }, async () => {
  const told = new Map<string, number>();
  const count = (what: string) => told.set(what, (told.get(what) ?? 0) + 1);
  const property = fc.asyncProperty(
    randomScopes,
    fc.constantFrom(...DIMENSIONS),
    fc.shuffledSubarray(Object.keys(SCREENS), { minLength: 3, maxLength: 3 }),
    fc.infiniteStream(fc.nat(1000)),
    async (scope, by, screens, picks) => {
      const pick = <Value>(values: Value[]): Value | undefined => values[Number(picks.next().value) % values.length];
      for (const screen of screens) {
        const chosen = pick((await SCREENS[screen]?.(scope, by)) ?? []);
        const measure = chosen && pick(MEASURES.filter((one) => chosen.figures[one] !== undefined));
        if (!measure) continue;
        await agrees({ measure, scope: chosen.scope }, chosen.figures[measure] ?? null);
        for (const what of [screen, measure]) count(what);
        if (chosen.scope[by].includes(UNSTATED)) count(UNSTATED);
      }
    },
  );
  await fc.assert(property, { numRuns: RUNS, seed: 1201, endOnFailure: true });
  // Each was met often enough that its agreement says something.
  for (const what of [...MEASURES, ...Object.keys(SCREENS), UNSTATED])
    expect(told.get(what) ?? 0, what).toBeGreaterThan(15);
});

test('says how it was computed, what was left out and how fresh it is', async () => {
  const small = await newCompany();
  const token = await small.token('owner');
  await writeRecords(small.scope, [
    { on: '2026-03-01', kg: '8', chargeKg: '10' },
    { on: '2026-03-02', kg: '4', chargeKg: '10' },
    { on: '2026-03-03', kg: '900', excluded: true },
    { on: '2026-04-30', kg: '1', refrigerant: 'R-22' },
  ]);
  const march = { ...EVERY_RECORD, from: '2026-03', to: '2026-03' };
  const total = await explained({ measure: 'totalYield', scope: march }, token);
  // (8 + 4) / (10 + 10).
  expect(total).toMatchObject({
    value: 0.6,
    unit: 'share',
    count: 2,
    sum: 12,
    parts: { kind: 'ratio', recoveredMass: 12, fullCharge: 20 },
    leftOut: [{ reason: 'entry_error', count: 1 }],
    fresh: { recordsUntil: '2026-04-30' },
    records: '/api/recoveries?from=2026-03&to=2026-03&exclusion=none',
  });
  expect(total.formula.filled.replaceAll('\u00a0', ' ')).toBe('12.0 kg ÷ 20.0 kg = 60.0%');
  expect(total.source).toContain('40 CFR 82.152');
  expect(Date.parse(total.fresh.lastChangeAt ?? '')).toBeGreaterThan(Date.now() - 3_600_000);
  const median = await explained({ measure: 'medianYield', scope: march }, token);
  expect(median.parts).toEqual({ kind: 'median', recoveries: 2, lower: 0.4, upper: 0.8 });
  expect(median.formula.filled).toBe('Between numbers 1 and 2 of 2 in order: (40.0% + 80.0%) ÷ 2 = 60.0%');
  // HCFC-22 has a GWP of 1810 in AR4 (40 CFR 98, Table A-1).
  const co2e = await explained({ measure: 'co2e', scope: { ...EVERY_RECORD, refrigerant: ['R-22'] } }, token);
  expect(co2e).toMatchObject({
    value: 1810,
    parts: { refrigerants: [{ refrigerant: 'R-22', recoveredMass: 1, gwp: 1810 }] },
  });
});

test('a company without a record has figures without a value', async () => {
  const token = await (await newCompany()).token('owner');
  expect(await explained({ measure: 'medianYield', scope: EVERY_RECORD }, token)).toMatchObject({
    value: null,
    count: 0,
    sum: 0,
    leftOut: [],
    fresh: { recordsUntil: null, lastChangeAt: null },
  });
  expect(await explained({ measure: 'recoveredMass', scope: EVERY_RECORD }, token)).toMatchObject({
    value: 0,
    count: 0,
  });
});

test('an unknown measure or a scope that is none is refused with its place', async () => {
  const refused = async (search: string) => {
    const response = await explainRoute(apiRequest(`/api/explain${search}`, owner), undefined);
    expect(response.status).toBe(400);
    return ((await response.json()) as { errors: { path: string }[] }).errors.map(({ path }) => path);
  };
  expect(await refused('')).toEqual(['measure']);
  expect(await refused('?measure=weight')).toEqual(['measure']);
  expect(await refused('?measure=recoveries&from=2026-13')).toEqual(['from']);
  expect(await refused('?measure=recoveries&category=chiller')).toEqual(['category']);
});

test('what judges recoveries is for who may read flags, like jobs of all for who compares people', async () => {
  const statusOf = async (route: Route, address: string, token: string) =>
    (await route(apiRequest(address, token), undefined as never)).status;
  const auditor = await company.token('auditor');
  const trainer = await company.token('trainer');
  const technician = await company.token('technician');
  for (const measure of ['flagged', 'farBelow'] as const) {
    expect(await statusOf(explainRoute, `/api/explain?measure=${measure}`, auditor)).toBe(403);
    expect(await statusOf(explainRoute, `/api/explain?measure=${measure}`, trainer)).toBe(200);
  }
  expect(await statusOf(explainRoute, '/api/explain?measure=flagged', technician)).toBe(200);
  expect(await statusOf(explainRoute, '/api/explain?measure=farBelow', technician)).toBe(403);
  expect(await statusOf(recordsRoute, '/api/recoveries?likeJobs=below', auditor)).toBe(403);
  expect(await statusOf(recordsRoute, '/api/recoveries?likeJobs=below', technician)).toBe(403);
  expect(await statusOf(recordsRoute, '/api/recoveries?flagged=yes', auditor)).toBe(403);
  expect(await statusOf(recordsRoute, '/api/recoveries?flagged=yes', technician)).toBe(200);
  expect(await statusOf(recordsRoute, '/api/recoveries?exclusion=none', auditor)).toBe(200);
  expect(await statusOf(recordsRoute, '/api/recoveries?exclusion=other', auditor)).toBe(400);
});
