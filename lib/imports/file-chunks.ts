import 'server-only';
import { createReadStream } from 'node:fs';
import { and, eq } from 'drizzle-orm';
import { type CompanyScope, type Tx, withCompanyJob } from '@/db/client';
import { importFileChunks } from '@/db/schema/imports';
import type { OpenFile } from './rows';

const CHUNK_BYTES = 256 * 1024;

/** Puts a file beside its import, in pieces: the queue can go on with it after any crash, on any server. */
export const writeChunks = async (tx: Tx, companyId: string, importId: string, path: string): Promise<void> => {
  let chunkNo = 0;
  for await (const bytes of createReadStream(path, { highWaterMark: CHUNK_BYTES })) {
    await tx.insert(importFileChunks).values({ companyId, importId, chunkNo, bytes });
    chunkNo += 1;
  }
};

/** Opens the kept file; each piece is read when it is asked for. */
export const keptFile = (scope: CompanyScope, importId: string): OpenFile =>
  async function* () {
    for (let chunkNo = 0; ; chunkNo += 1) {
      const [chunk] = await withCompanyJob(scope, (tx) =>
        tx
          .select({ bytes: importFileChunks.bytes })
          .from(importFileChunks)
          .where(and(eq(importFileChunks.importId, importId), eq(importFileChunks.chunkNo, chunkNo))),
      );
      if (!chunk) return;
      yield chunk.bytes;
    }
  };
