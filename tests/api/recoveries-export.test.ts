import { eq } from 'drizzle-orm';
import fc from 'fast-check';
import Papa from 'papaparse';
import { beforeAll, expect, test } from 'vitest';
import { GET } from '@/app/api/recoveries/route';
import { withCompany } from '@/db/client';
import { recoveries } from '@/db/schema/recoveries';
import { refrigerants } from '@/db/schema/refrigerants';
import { fromFormulaSafe } from '@/lib/formula-safe';
import { RECOVERY_FIELDS } from '@/lib/imports/fields';
import { profileFile, readRows } from '@/lib/imports/read-file';
import type { RecoveryRow } from '@/lib/imports/rows';
import { apiRequest, newCompany } from '../support/company';
import { addRecoveries, newPlaces, type Places } from '../support/ticket-records';

let company: Awaited<ReturnType<typeof newCompany>>;
let places: Places;
let token: string;

const exported = async (search = '', asToken = token): Promise<string> => {
  const response = await GET(apiRequest(`/api/recoveries?format=csv${search}`, asToken), undefined);
  expect(response.status).toBe(200);
  return response.text();
};
const rowsOf = (text: string) =>
  Papa.parse<Record<string, string>>(text.replace(/^\uFEFF/, ''), { header: true, skipEmptyLines: true }).data;

const readAgain = async (text: string): Promise<RecoveryRow[]> => {
  const bytes = new TextEncoder().encode(text);
  const open = async function* () {
    yield bytes;
  };
  const known = await withCompany(company.scope, (tx) =>
    tx.select({ name: refrigerants.designation }).from(refrigerants),
  );
  const context = {
    fileName: 'again.csv',
    timeZone: 'America/New_York',
    refrigerants: new Set(known.map(({ name }) => name)),
    today: '2026-12-01',
  };
  const plan = await profileFile(open, {}, null, context);
  expect(plan.reading.questions).toEqual([]);
  const rows: RecoveryRow[] = [];
  for await (const batch of readRows(open, plan, context))
    for (const parsed of batch) {
      if (!parsed.ok) throw new Error(JSON.stringify(parsed.reasons));
      rows.push(parsed.row);
    }
  return rows;
};

beforeAll(async () => {
  company = await newCompany();
  token = await company.token('owner');
  places = await newPlaces(company.scope);
  await addRecoveries(company.scope, places, [
    {
      recordRef: 'E-1',
      recoveredOn: '2026-11-01',
      // 01:30 comes twice on the night the clocks go back; this is the second.
      recoveredAt: '2026-11-01T06:30:00Z',
      nameplateChargeKg: '5.669904625',
      addedChargeKg: '0.453592370',
      startWeightKg: '7.937866475',
      endWeightKg: '12.791304834',
      recoveredMassKg: '4.853438359',
      massUnit: 'lb',
      finalVacuumKpaAbs: '3.119719',
      vacuumUnit: 'inhg',
      holdMinutes: 5.5,
      holdRiseKpa: '0.338639',
      cylinderId: places.cylinderId,
      branchId: places.branchId,
      category: 'comfort_cooling',
      jobType: 'repair',
      disposition: 'in_cylinder',
      manufacturedOn: '2011-05-01',
      technicianCertification: 'universal',
      notes: 'said "dry, clean"',
      entered: { nameplate_charge: '12.50', mass_unit: 'lb' },
    },
    {
      recordRef: 'E-2',
      recoveredOn: '2026-07-01',
      recoveredAt: '2026-07-02T02:30:00Z',
      nameplateChargeKg: '1.360777110',
      recoveredMassKg: '0.609514747',
      massUnit: 'lb-oz',
      finalVacuumKpaAbs: '0.066661',
      vacuumUnit: 'micron',
      notes: '-3 at the gauge',
    },
    {
      recordRef: '=1+1',
      recoveredOn: '2026-06-01',
      massUnit: 'oz',
      nameplateChargeKg: '0.396893324',
      recoveredMassKg: '0.198446662',
    },
    {
      recordRef: "'@SUM(A1)",
      recoveredOn: '2026-05-01',
      massUnit: 'g',
      nameplateChargeKg: '0.35',
      recoveredMassKg: '0.3',
    },
    {
      recordRef: '-17',
      recoveredOn: '2026-04-01',
      finalVacuumKpaAbs: '50.9',
      vacuumUnit: 'psig',
      refrigerant: 'R-22',
      extra: { 'Work order': '+44' },
    },
  ]);
});

test('the columns are those of the recovery file, in its order, with columns of imported files behind', async () => {
  const [header] = (await exported()).replace(/^\uFEFF/, '').split('\r\n');
  expect(header).toBe([...RECOVERY_FIELDS, 'Work order'].join(','));
});

test('masses and pressures come in the units they were entered in', async () => {
  const rows = rowsOf(await exported());
  // 5.669904625 kg = 12.5 lb; typed 12.50, and so it stays. 0.609514747 kg = 1 lb 5.5 oz. 14 oz = 0.396893324 kg.
  expect(rows[0]).toMatchObject({
    nameplate_charge: '12.50',
    added_charge: '1',
    mass_unit: 'lb',
    start_weight: '17.5',
  });
  expect(rows[0]).toMatchObject({ final_vacuum: '29', hold_rise: '0.1', hold_minutes: '5.5', end_weight: '28.2' });
  expect(rows[1]).toMatchObject({
    nameplate_charge: '3',
    recovered_mass: '1-5.5',
    final_vacuum: '500',
    vacuum_unit: 'micron',
  });
  expect(rows[2]).toMatchObject({ nameplate_charge: '14', recovered_mass: '7' });
});

test('a time of day is the local one, and in UTC where it comes twice', async () => {
  const rows = rowsOf(await exported());
  expect(rows.map((row) => row.recovered_at).slice(0, 3)).toEqual([
    '2026-11-01T06:30:00Z',
    '2026-07-01T22:30:00',
    '2026-06-01',
  ]);
});

test('no cell can run as a formula, and plain numbers stay numbers', async () => {
  const rows = rowsOf(await exported());
  expect(rows.map((row) => row.record_ref)).toEqual(['E-1', 'E-2', "'=1+1", "''@SUM(A1)", '-17']);
  expect(rows[1]?.notes).toBe("'-3 at the gauge");
  expect(rows[4]?.['Work order']).toBe('+44');
  // OWASP, CSV Injection: = + - @, tab and carriage return.
  for (const row of rows) for (const cell of Object.values(row)) expect(cell).not.toMatch(/^[=@\t\r]|^[+-](?![\d.]+$)/);
});

test('the file read in again says the same of every record', async () => {
  const rows = await readAgain(await exported());
  const kept = await withCompany(company.scope, (tx) =>
    tx.select().from(recoveries).where(eq(recoveries.companyId, company.companyId)),
  );
  const decimal = (value: string | number | null) => (value === null ? null : Number(value));
  const instant = (text: string | null) => text && new Date(text).toISOString();
  expect(rows).toHaveLength(kept.length);
  for (const row of rows) {
    const record = kept.find(({ recordRef }) => recordRef === row.recordRef);
    expect(record).toBeDefined();
    if (!record) continue;
    for (const field of [
      'nameplateChargeKg',
      'addedChargeKg',
      'startWeightKg',
      'endWeightKg',
      'recoveredMassKg',
    ] as const)
      expect([field, decimal(row[field])]).toEqual([field, decimal(record[field])]);
    for (const field of ['finalVacuumKpaAbs', 'holdRiseKpa', 'holdMinutes'] as const)
      expect([field, decimal(row[field])]).toEqual([field, decimal(record[field])]);
    for (const field of [
      'recoveredOn',
      'refrigerant',
      'massUnit',
      'vacuumUnit',
      'category',
      'jobType',
      'notes',
    ] as const)
      expect([field, row[field]]).toEqual([field, record[field]]);
    for (const field of ['disposition', 'manufacturedOn', 'technicianCertification', 'extra'] as const)
      expect([field, row[field]]).toEqual([field, record[field]]);
    expect(instant(row.recoveredAt)).toBe(instant(record.recoveredAt));
  }
});

test('whatever text a record holds comes back from the file as it was', async () => {
  const { companyId, scope, ...other } = await newCompany();
  const there = await newPlaces(scope);
  const texts = fc.sample(
    fc.string({ unit: 'grapheme', minLength: 1, maxLength: 30 }).filter((text) => !text.includes('\0')),
    { numRuns: 200, seed: 7 },
  );
  await addRecoveries(
    scope,
    there,
    texts.map((notes) => ({ companyId, notes })),
  );
  const rows = rowsOf(await exported('&sort=recordRef', await other.token('owner')));
  expect(rows.map((row) => fromFormulaSafe(row.notes ?? ''))).toEqual(texts);
});

test('the export has the whole scope and nothing else, whatever its size', async () => {
  const { scope, ...other } = await newCompany();
  const there = await newPlaces(scope);
  const many = Array.from({ length: 2500 }, (_, index) => ({ recoveredOn: index % 2 ? '2026-01-15' : '2026-02-15' }));
  await addRecoveries(scope, there, many);
  const owner = await other.token('owner');
  expect(rowsOf(await exported('', owner))).toHaveLength(2500);
  const january = rowsOf(await exported('&from=2026-01&to=2026-01&sort=recordRef', owner));
  expect(january).toHaveLength(1250);
  expect(january.map((row) => row.record_ref).slice(0, 3)).toEqual(['T-2', 'T-4', 'T-6']);
  const masses = rowsOf(await exported('&sort=-recoveredMass&limit=1', owner));
  expect(masses).toHaveLength(2500);
});

test('the name of the file tells scope and day, whatever was asked', async () => {
  const name = async (search: string) => {
    const response = await GET(apiRequest(`/api/recoveries?format=csv${search}`, token), undefined);
    await response.text();
    return response.headers.get('content-disposition');
  };
  expect(await name('&from=2026-01&refrigerant=R-22')).toMatch(
    /^attachment; filename="recoveries_from_2026-01_R-22_on_\d{4}-\d\d-\d\d\.csv"$/,
  );
  expect(await name(`&site=${encodeURIComponent('a"\r\nx: ü/../b')}`)).toMatch(/filename="recoveries_[\w.-]+\.csv"$/);
});

test('a technician exports his own records only, and nobody exports without a token', async () => {
  const own = await company.token('technician', places.otherTechnicianId);
  expect(rowsOf(await exported('', own))).toEqual([]);
  expect((await GET(apiRequest('/api/recoveries?format=csv', ''), undefined)).status).toBe(401);
});

test('a reader who goes away ends the query and frees its connection', async () => {
  for (let round = 0; round < 20; round++) {
    const response = await GET(apiRequest('/api/recoveries?format=csv', token), undefined);
    await response.body?.cancel();
  }
  expect(rowsOf(await exported())).toHaveLength(5);
});
