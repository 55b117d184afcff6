import { readFileSync } from 'node:fs';
import { sql } from 'drizzle-orm';
import Papa from 'papaparse';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { withCompany } from '@/db/client';
import { type RunningWorker, startWorker } from '@/lib/jobs/worker';
import { newCompany } from '../support/company';
import { refusedRows, takeBack, takeIn } from '../support/imports';
import { countOf, tableContents } from '../support/tables';

const read = (name: string) => new Uint8Array(readFileSync(`tests/fixtures/sample-company/${name}`));

let worker: RunningWorker;
beforeAll(() => {
  worker = startWorker();
});
afterAll(() => worker.stop());

/**
 * Decimal pounds in hundred-millionths of a gram: 1 lb = 453.59237 g exactly (NIST Handbook 44, appendix C). Written
 * apart from lib/units.ts on purpose.
 */
const hundredMillionthsOfGram = (pounds: string): bigint => {
  const [whole = '0', fraction = ''] = pounds.split('.');
  return (BigInt(whole + fraction.padEnd(3, '0')) * 45_359_237n) / 1n;
};

type FileRow = Record<'record_ref' | 'recovered_at' | 'refrigerant' | 'recovered_mass', string>;

const sumsOfFile = (text: string, refused: ReadonlySet<string>): Map<string, bigint> => {
  const sums = new Map<string, bigint>();
  const seen = new Set<string>();
  for (const row of Papa.parse<FileRow>(text, { header: true, skipEmptyLines: true }).data) {
    if (refused.has(row.record_ref) || seen.has(row.record_ref)) continue;
    seen.add(row.record_ref);
    const key = `${row.recovered_at.slice(0, 7)} ${row.refrigerant}`;
    sums.set(key, (sums.get(key) ?? 0n) + hundredMillionthsOfGram(row.recovered_mass));
  }
  return sums;
};

const sumsOfRecords = async (companyId: string): Promise<Map<string, string>> => {
  const { rows } = await withCompany({ companyId, actor: 'test' }, (tx) =>
    tx.execute<{ key: string; grams: string }>(sql`
      select to_char(recovered_month, 'YYYY-MM') || ' ' || refrigerant as key, sum(recovered_mass_kg) * 1000 as grams
      from recoveries group by 1`),
  );
  return new Map(rows.map(({ key, grams }) => [key, grams]));
};

test('the sample company’s months and refrigerants add up to the gram', async () => {
  const { companyId, token } = await newCompany();
  const bearer = await token('office');
  const first = await takeIn(bearer, read('recoveries.csv'));
  expect(first).toMatchObject({ status: 'done', rowsRead: 4053, rowsTotal: 4053, updated: 0, failure: null });
  expect(first.added + first.unchanged + first.rejected).toBe(4053);
  // Few enough that the sums below mean something.
  expect(first.rejected).toBeLessThan(60);
  const refused = Papa.parse<FileRow>((await refusedRows(bearer, first.id)).replace('\uFEFF', ''), { header: true });
  const expected = sumsOfFile(
    new TextDecoder().decode(read('recoveries.csv')),
    new Set(refused.data.map((row) => row.record_ref)),
  );
  const found = await sumsOfRecords(companyId);
  expect([...found.keys()].sort()).toEqual([...expected.keys()].sort());
  // The reader's three decimals of a pound and the table's micrograms are both far below a gram.
  for (const [key, scaled] of expected)
    expect(Math.abs(Number(found.get(key)) - Number(scaled) / 1e8), key).toBeLessThan(0.5);

  // The planner knows of the rows as soon as the import is done, so that the first screen after it is quick.
  const known = await withCompany({ companyId, actor: 'test' }, (tx) =>
    tx.execute<{ rows: number }>(sql`select reltuples as rows from pg_class where oid = 'recoveries'::regclass`),
  );
  expect(known.rows[0]?.rows).toBeGreaterThanOrEqual(first.added);

  const second = await takeIn(bearer, read('recoveries.csv'));
  expect(second).toMatchObject({ added: 0, updated: 0, unchanged: 4053 - first.rejected, rejected: first.rejected });

  expect((await takeBack(bearer, first.id)).status).toBe(200);
  for (const table of ['recoveries', 'technicians', 'sites', 'appliances', 'branches', 'cylinders'])
    expect(await countOf(companyId, table), table).toBe(0);
});

test.each(['bom-semicolon-decimal-comma.csv', 'utf16-tab.txt', 'windows-1252-names.csv'])(
  '%s says what plain.csv says: every row is unchanged after it',
  async (name) => {
    const { token } = await newCompany();
    const bearer = await token('office');
    const plain = await takeIn(bearer, read('nasty/plain.csv'));
    const other = await takeIn(bearer, read(`nasty/${name}`));
    expect(other).toMatchObject({ status: 'done', rowsRead: plain.rowsRead, added: 0 });
    if (name !== 'windows-1252-names.csv') expect(other).toMatchObject({ updated: 0, unchanged: plain.added });
  },
);

test.each([
  ['day-month-year.csv', 'dmy'],
  ['month-day-year.csv', 'mdy'],
] as const)('%s takes the months of plain.csv, asking once for the order of dates if it must', async (name, order) => {
  const { companyId, token } = await newCompany();
  const bearer = await token('office');
  const first = await takeIn(bearer, read(`nasty/${name}`));
  if (first.status === 'failed') {
    expect(first.failure).toContain('recovered_at');
    const told = await takeIn(bearer, read(`nasty/${name}`), { mapping: { dateOrders: { recovered_at: order } } });
    expect(told.status).toBe('done');
  }
  const other = await newCompany();
  await takeIn(await other.token('office'), read('nasty/plain.csv'));
  expect(await sumsOfRecords(companyId)).toEqual(await sumsOfRecords(other.companyId));
});

test('an import and its undo leave what was there before, also what was changed', async () => {
  const { companyId, token } = await newCompany();
  const bearer = await token('office');
  await takeIn(bearer, read('nasty/plain.csv'));
  const before = await tableContents(companyId);
  const changed = new TextDecoder().decode(read('recoveries.csv')).replaceAll(',repair,', ',service,');
  const { id, updated, added } = await takeIn(bearer, changed);
  expect(updated).toBeGreaterThan(50);
  expect(added).toBeGreaterThan(3000);
  expect((await takeBack(bearer, id)).status).toBe(200);
  expect(await tableContents(companyId)).toEqual(before);
});
