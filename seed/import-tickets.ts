import { createHash } from 'node:crypto';
import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { and, eq } from 'drizzle-orm';
import { withCompanyJob } from '@/db/client';
import { imports } from '@/db/schema/imports';
import type { Viewer } from '@/lib/auth/viewer';
import { createImport } from '@/lib/imports/store';
import { takeIn } from '@/lib/imports/take-in';
import { recoveryFile, recoveryFileMapping } from './recovery-file';
import type { Ticket } from './ticket';

/** How often it is asked, every tenth of a second, whether a worker has come to the end. */
const MOST_LOOKS = 300;

/** How an import ended; waits half a minute for a worker that may have it in hands. */
const endOf = async (companyId: string, importId: string): Promise<string | undefined> => {
  for (let looks = 0; looks < MOST_LOOKS; looks++) {
    const [row] = await withCompanyJob({ companyId, actor: 'import' }, (tx) =>
      tx
        .select({ status: imports.status })
        .from(imports)
        .where(and(eq(imports.companyId, companyId), eq(imports.id, importId))),
    );
    if (row?.status !== 'queued' && row?.status !== 'running') return row?.status;
    await sleep(100);
  }
  return undefined;
};

/**
 * Hands the tickets in as `viewer` would, through the import that everybody uses, and does its work here and now: the
 * queue's own turn then finds it done. Gives the id of the import; throws what the import throws.
 */
export const importTickets = async (viewer: Viewer, tickets: readonly Ticket[], fileName: string): Promise<string> => {
  const folder = await mkdtemp(join(tmpdir(), 'tarebook-demo-'));
  try {
    const bytes = Buffer.from(recoveryFile(tickets));
    const path = join(folder, 'recoveries.csv');
    await writeFile(path, bytes);
    const file = { path, fileName, size: bytes.length, sha256: createHash('sha256').update(bytes).digest('hex') };
    const fields = new Map([['mapping', JSON.stringify(recoveryFileMapping)]]);
    const importId = await createImport(viewer, { file, fields }, null);
    const { companyId, actor } = viewer;
    try {
      await takeIn({ companyId, importId, actor });
    } catch (error) {
      // A worker that runs elsewhere may have had it in hands at the same moment: then its end is what counts.
      if ((await endOf(companyId, importId)) !== 'done') throw error;
    }
    return importId;
  } finally {
    await rm(folder, { recursive: true, force: true });
  }
};
