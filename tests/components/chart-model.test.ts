import fc from 'fast-check';
import Papa from 'papaparse';
import { createElement } from 'react';
import { renderToStaticMarkup } from 'react-dom/server';
import readXlsxFile from 'read-excel-file/node';
import { beforeAll, expect, test } from 'vitest';
import writeXlsxFile from 'write-excel-file/node';
import { DIMENSIONS, type Dimension } from '@/analytics/dimensions';
import type { FigureScope } from '@/analytics/figures/figure';
import type { MonthlyTrends } from '@/analytics/monthly-trends/contract';
import { toStacks } from '@/analytics/monthly-trends/series';
import { EVERY_RECORD, scopeQuery } from '@/analytics/scope-address';
import { GET } from '@/app/api/trends/monthly/route';
import { fileColumns, tableColumns } from '@/components/charts/model';
import { modelFile } from '@/components/charts/model-file';
import { ModelTable } from '@/components/charts/model-table';
import { toCsv } from '@/components/files/csv';
import { toWorkbook } from '@/components/files/xlsx';
import { monthsModel } from '@/components/trends/months-model';
import { searchString } from '@/lib/api/client';
import { plainCharacters } from '@/lib/format';
import { KG_PER_UNIT } from '@/lib/units';
import { DISPLAY_UNITS, type DisplayUnit } from '@/lib/vocabulary';
import { apiRequest, newCompany } from '../support/company';
import { randomRecords } from '../support/random-records';
import { randomScopes } from '../support/random-scopes';
import { writeRecords } from '../support/records';

const company = await newCompany();
let owner = '';
beforeAll(async () => {
  owner = await company.token('owner');
  // A site whose name a spreadsheet would run.
  const hostile = { on: '2026-05-05', kg: '1.234', site: "=HYPERLINK('x')", technician: '@sum(1)' };
  await writeRecords(company.scope, [...randomRecords(240, 42), { ...hostile, ref: 'hostile' }]);
});

const answerOf = async (scope: FigureScope, by: Dimension, keys?: number): Promise<MonthlyTrends> => {
  const response = await GET(
    apiRequest(`/api/trends/monthly${searchString({ ...scopeQuery(scope), by, ...(keys ? { keys } : {}) })}`, owner),
    undefined,
  );
  // The route has checked its answer by this contract.
  return (await response.json()) as MonthlyTrends;
};

const origin = { madeAt: new Date('2026-12-01T12:00:00Z'), address: 'http://tarebook.test/trends?by=site' };
const modelOf = (trends: MonthlyTrends, scope: FigureScope, unit: DisplayUnit) =>
  monthsModel(toStacks(trends), trends.by, { ...scope, unit }, {});
const csvRows = (text: string): string[][] => Papa.parse<string[]>(text.replace('\uFEFF', '').trimEnd()).data;
/** The cells of the table as it is drawn, oldest month first. */
const drawnRows = (model: ReturnType<typeof modelOf>): string[][] =>
  renderToStaticMarkup(createElement(ModelTable, { model, label: 'months' }))
    .split('<tr')
    .slice(2)
    .map((row) =>
      [...row.matchAll(/<t[hd][^>]*>(.*?)<\/t[hd]>/g)].map(([, cell]) =>
        plainCharacters((cell ?? '').replace(/<[^>]+>/g, '')),
      ),
    )
    .reverse();

/** What the API says of a month under a column of the model, masses in kg. */
const saidByApi = (trends: MonthlyTrends, model: ReturnType<typeof modelOf>, month: string, key: string) => {
  const figures = trends.months.find((row) => row.month === month);
  const whole = month !== trends.partialMonth && !trends.cutMonths.includes(month);
  // Of a month without a record the API says nothing but what its year before was, a row further up.
  const then = `${Number(month.slice(0, 4)) - 1}${month.slice(4)}`;
  const before = figures ? figures.yearBefore : trends.months.find((row) => row.month === then)?.recoveredMass;
  const yearBefore = whole ? (before ?? null) : null;
  switch (key) {
    case 'all':
      return figures?.recoveredMass ?? 0;
    case 'recoveries':
      return figures?.recoveries ?? 0;
    case 'medianYield':
      return figures?.medianYield ?? null;
    case 'yearBefore':
      return yearBefore;
    case 'change':
      return yearBefore ? (figures?.recoveredMass ?? 0) / yearBefore - 1 : null;
    default: {
      if (key === 'rest') return trends.otherKeys?.rows.find((row) => row.month === month)?.recoveredMass ?? 0;
      const keys = model.open(month, key)?.scope[trends.by] ?? [];
      const rows = trends.rows.filter((row) => row.month === month && keys.includes(row.key));
      return rows.reduce((sum, row) => sum + row.recoveredMass, 0);
    }
  }
};

const drawnNumber = (text: string, kind: string): number | null => {
  if (text === '—') return null;
  if (text === '–') return 0;
  return Number(text.replace(/[,%+]/g, '')) / (kind === 'share' || kind === 'change' ? 100 : 1);
};
/** Half of the last digit that the table shows. */
const DRAWN_WITHIN = { mass: 0.0501, count: 0, share: 0.00501, change: 0.00501, factor: 0.00501 };

test('table, CSV and Excel say the same, and what the API says', { timeout: 300_000 }, async () => {
  let cells = 0;
  const property = fc.asyncProperty(
    randomScopes,
    fc.constantFrom(...DIMENSIONS),
    fc.constantFrom(...DISPLAY_UNITS),
    fc.constantFrom(undefined, 1, 2),
    async (scope, by, unit, keys) => {
      const trends = await answerOf(scope, by, keys);
      const model = modelOf(trends, scope, unit);
      const table = modelFile(model);
      const [, ...csv] = csvRows(toCsv(table));
      const workbook = await readXlsxFile(await writeXlsxFile(toWorkbook(table, origin)).toBuffer());
      const xlsx = workbook[0]?.data.slice(1) ?? [];
      const drawn = drawnRows(model);
      const shown = tableColumns(model);
      expect([csv.length, xlsx.length, drawn.length]).toEqual(Array(3).fill(model.months.length));
      model.months.forEach(({ month }, row) => {
        expect(csv[row]?.[0]).toBe(month);
        expect(xlsx[row]?.[0]).toEqual(new Date(`${month}-01T00:00:00Z`));
        fileColumns(model).forEach(({ key, kind }, column) => {
          cells += 1;
          const what = `${month} ${key} of ${JSON.stringify(scope)}`;
          const text = csv[row]?.[column + 2] ?? '';
          const value = text === '' ? null : Number(text);
          expect(xlsx[row]?.[column + 2] ?? null, what).toBe(value);
          const drawnAt = shown.findIndex((one) => one.key === key);
          if (drawnAt >= 0) {
            const onScreen = drawnNumber(drawn[row]?.[drawnAt + 1] ?? '', kind);
            if (onScreen === null || value === null) expect(onScreen, what).toBe(value);
            else
              expect(Math.abs(onScreen - value), what).toBeLessThanOrEqual(DRAWN_WITHIN[kind] + Math.abs(value) * 1e-9);
          }
          const said = saidByApi(trends, model, month, key);
          if (said === null || value === null) expect(value, what).toBe(said);
          // Files round a mass to the thousandth of its unit.
          else expect(Math.abs(value - said / (kind === 'mass' ? KG_PER_UNIT[unit] : 1)), what).toBeLessThan(0.000501);
        });
      });
    },
  );
  await fc.assert(property, { numRuns: 80, seed: 12, endOnFailure: true });
  expect(cells).toBeGreaterThan(1000);
});

test('the workbook has typed cells and says what it holds', async () => {
  const trends = await answerOf(
    { ...EVERY_RECORD, from: '2026-05', to: '2026-06', refrigerant: ['R-22', 'R-410A'] },
    'refrigerant',
  );
  const table = modelFile(
    modelOf(trends, { ...EVERY_RECORD, from: '2026-05', to: '2026-06', refrigerant: ['R-22', 'R-410A'] }, 'lb'),
  );
  const [figures, about] = await readXlsxFile(await writeXlsxFile(toWorkbook(table, origin)).toBuffer());
  expect(figures?.sheet).toBe('Figures');
  expect(figures?.data[0]?.slice(0, 2)).toEqual(['Month', 'Month is']);
  expect(figures?.data[0]).toContain('R-22, lb');
  const may = figures?.data[1] ?? [];
  expect(may[0]).toBeInstanceOf(Date);
  expect(typeof may[1]).toBe('string');
  expect(may.slice(2, 5).every((cell) => typeof cell === 'number')).toBe(true);
  expect(Object.fromEntries(about?.data.map(([key, value]) => [String(key), value]) ?? [])).toEqual({
    What: 'Recovered mass by month',
    Recoveries: 'May 2026 to June 2026, R-22 and R-410A',
    'Masses in': 'lb',
    'Made (UTC)': origin.madeAt,
    Rows: 2,
    Address: origin.address,
  });
});

test('a name that a spreadsheet would run stays a name', async () => {
  const scope = { ...EVERY_RECORD, from: '2026-05', to: '2026-05' };
  const table = modelFile(modelOf(await answerOf({ ...scope, site: ["=HYPERLINK('x')"] }, 'site'), scope, 'kg'));
  const [heads] = csvRows(toCsv(table));
  expect(heads).toContain("'=HYPERLINK('x'), kg");
  const [figures] = await readXlsxFile(await writeXlsxFile(toWorkbook(table, origin)).toBuffer());
  expect(figures?.data[0]).toContain("=HYPERLINK('x'), kg");
});
