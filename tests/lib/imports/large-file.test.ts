import { setFlagsFromString } from 'node:v8';
import { runInNewContext } from 'node:vm';
import { expect, test } from 'vitest';
import { profileFile, readRows } from '@/lib/imports/read-file';
import type { OpenFile } from '@/lib/imports/rows';
import { CONTEXT } from '@/tests/support/read-recovery-file';

setFlagsFromString('--expose-gc');
const collectGarbage: () => void = runInNewContext('gc');

const ROWS = 200_000;
const PORTION = 1_000;
const HEADER =
  'record_ref,recovered_at,technician,site,appliance,refrigerant,nameplate_charge,start_weight,end_weight,recovered_mass,mass_unit,notes\n';

let bytesGiven = 0;
const open: OpenFile = async function* () {
  bytesGiven = HEADER.length;
  yield Buffer.from(HEADER);
  for (let first = 0; first < ROWS; first += PORTION) {
    const rows = Array.from({ length: PORTION }, (_, i) => {
      const n = first + i;
      const date = `${2000 + (n % 26)}-0${1 + (n % 9)}-${10 + (n % 18)}T1${n % 10}:06:00`;
      return `T-${n},${date},Technician ${n % 30},S${n % 400},A${n % 3000},R-22,8.2,17.5,21.9,4.4,lb,"Row ${n}, as ""typed"" in the office"\n`;
    });
    const bytes = Buffer.from(rows.join(''));
    bytesGiven += bytes.length;
    yield bytes;
  }
};

test('200,000 rows in more than 20 MB are read in flat memory', { timeout: 300_000 }, async () => {
  collectGarbage();
  const before = process.memoryUsage().heapUsed;
  const plan = await profileFile(open, {}, null, CONTEXT);
  expect(bytesGiven).toBeGreaterThan(20_000_000);
  expect(plan.rowsTotal).toBe(ROWS);
  let taken = 0;
  let growth = 0;
  for await (const batch of readRows(open, plan, CONTEXT)) {
    taken += batch.filter(({ ok }) => ok).length;
    if (taken % 50_000 < 2_000) {
      collectGarbage();
      growth = Math.max(growth, process.memoryUsage().heapUsed - before);
    }
  }
  expect(taken).toBe(ROWS);
  console.info(`heap grew by ${(growth / 1e6).toFixed(1)} MB over ${(bytesGiven / 1e6).toFixed(1)} MB of file`);
  // Less than the file itself: a batch of rows, never the whole.
  expect(growth).toBeLessThan(16_000_000);
});
