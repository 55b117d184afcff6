import { createHash } from 'node:crypto';
import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Viewer } from '@/lib/auth/viewer';
import { createImport } from '@/lib/imports/store';
import { takeIn } from '@/lib/imports/take-in';
import { recoveryFile, recoveryFileMapping } from './recovery-file';
import type { Ticket } from './ticket';

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
    await takeIn({ companyId: viewer.companyId, importId, actor: viewer.actor });
    return importId;
  } finally {
    await rm(folder, { recursive: true, force: true });
  }
};
