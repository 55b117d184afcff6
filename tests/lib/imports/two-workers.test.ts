import { mkdtempSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { expect, test } from 'vitest';
import { createImport } from '@/lib/imports/store';
import { takeIn } from '@/lib/imports/take-in';
import { newCompany } from '@/tests/support/company';
import { look } from '@/tests/support/imports';
import { recoveryFile } from '@/tests/support/recovery-file';

test('workers that take the same import at once take it in once', async () => {
  const { companyId, name, token } = await newCompany();
  const bytes = [...recoveryFile(400)].join('');
  const path = join(mkdtempSync(join(tmpdir(), 'tarebook-test-')), 'recoveries.csv');
  writeFileSync(path, bytes);
  const importId = await createImport(
    {
      ...{ kind: 'program', actor: 'office', name: 'office', companyId, companyName: name },
      ...{ role: 'office', technicianId: null, timeZone: 'America/New_York', massUnit: 'lb' },
    },
    { file: { path, fileName: 'recoveries.csv', size: bytes.length, sha256: 'two workers' }, fields: new Map() },
    null,
  );
  const work = { companyId, importId, actor: 'office' };
  await Promise.all([takeIn(work), takeIn(work), takeIn(work)]);
  expect(await look(await token('office'), importId)).toMatchObject({ status: 'done', rowsRead: 400, added: 400 });
});
