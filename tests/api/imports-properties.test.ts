import fc from 'fast-check';
import Papa from 'papaparse';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { type RunningWorker, startWorker } from '@/lib/jobs/worker';
import { newCompany } from '../support/company';
import { takeBack, takeIn } from '../support/imports';
import { tableContents } from '../support/tables';

let worker: RunningWorker;
beforeAll(() => {
  worker = startWorker();
});
afterAll(() => worker.stop());

// Each run works on a company of its own in a real database, so there are few of them; the seed is fixed.
const SETTINGS = { numRuns: 12, seed: 20_260_801 };

const name = fc.constantFrom(
  'Ada Moss',
  'ada  MOSS',
  'Łucja',
  'O’Neil, Bo',
  '=SUM(A1)',
  "'quoted'",
  'a "b"',
  '-',
  '北京',
);
const text = fc.oneof(fc.constant(''), fc.string({ maxLength: 12, unit: 'binary' }), name);

/** Rows of which some are good, some bad, some repeat or contradict one another: few refs, few names, odd texts. */
const row = fc.record({
  record_ref: fc.oneof({ weight: 9, arbitrary: fc.integer({ min: 1, max: 12 }).map((n) => `T-${n}`) }, fc.constant('')),
  recovered_at: fc.constantFrom('2024-02-29', '2023-07-01', '2023-07-01T13:30:00', '2024-02-30', 'soon'),
  technician: name,
  site: name,
  appliance: fc.constantFrom('RTU-1', 'rtu-1', 'Chiller'),
  refrigerant: fc.constantFrom('R-410A', '410a', 'R22', 'R-22', 'water'),
  nameplate_charge: fc.constantFrom('5', '12.5', '0', '-1', ''),
  recovered_mass: fc.constantFrom('4', '4.0', '0.25', '-2', 'four'),
  mass_unit: fc.constantFrom('kg', 'lb', 'oz'),
  cylinder: fc.oneof(fc.constant(''), name),
  notes: text,
  'Truck no.': text,
});
const file = fc
  .array(row, { minLength: 1, maxLength: 30 })
  .map((rows) => Papa.unparse(rows, { quotes: true, newline: '\r\n' }));

const newOffice = async () => {
  const { companyId, token } = await newCompany();
  return { companyId, bearer: await token('office') };
};

test('every row read is added, updated, unchanged or refused; the same file again changes nothing', async () => {
  await fc.assert(
    fc.asyncProperty(file, async (content) => {
      const { companyId, bearer } = await newOffice();
      const first = await takeIn(bearer, content);
      expect(first).toMatchObject({ status: 'done', failure: null, updated: 0 });
      expect(first.added + first.unchanged + first.rejected).toBe(first.rowsRead);
      const once = await tableContents(companyId);
      expect(once.recoveries).toHaveLength(first.added);
      const second = await takeIn(bearer, content);
      expect(second).toMatchObject({ rowsRead: first.rowsRead, added: 0, updated: 0, rejected: first.rejected });
      expect(second.unchanged).toBe(first.added + first.unchanged);
      expect(await tableContents(companyId)).toEqual(once);
    }),
    SETTINGS,
  );
}, 240_000);

test('an import and its undo leave everything as it was, whatever was there before', async () => {
  await fc.assert(
    fc.asyncProperty(file, file, async (earlier, later) => {
      const { companyId, bearer } = await newOffice();
      await takeIn(bearer, earlier);
      const before = await tableContents(companyId);
      const { id, status } = await takeIn(bearer, later);
      expect(status).toBe('done');
      expect((await takeBack(bearer, id)).status).toBe(200);
      expect(await tableContents(companyId)).toEqual(before);
    }),
    SETTINGS,
  );
}, 240_000);

test('a preview foretells exactly what the import then does', async () => {
  await fc.assert(
    fc.asyncProperty(file, file, async (earlier, later) => {
      const { bearer } = await newOffice();
      await takeIn(bearer, earlier);
      const counts = ({
        rowsRead,
        added,
        updated,
        unchanged,
        rejected,
        summary,
      }: Awaited<ReturnType<typeof takeIn>>) => ({
        ...{ rowsRead, added, updated, unchanged, rejected, summary },
      });
      const foretold = counts(await takeIn(bearer, later, { dryRun: true }));
      expect(counts(await takeIn(bearer, later))).toEqual(foretold);
    }),
    SETTINGS,
  );
}, 240_000);
