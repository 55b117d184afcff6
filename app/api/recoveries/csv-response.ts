import 'server-only';
import type { RecordListQuery } from '@/analytics/records/contract';
import { exportName } from '@/analytics/records/export-name';
import { exportRecords } from '@/analytics/records/export-query';
import { scopeOf, type Viewer } from '@/lib/auth/viewer';
import { log } from '@/lib/log';
import { todayIn } from '@/lib/recoveries/local-time';

/** Excel takes a file for Windows-1252 unless it begins with this. */
const BYTE_ORDER_MARK = '\uFEFF';

/** The records in scope as a file that is written while it is read; a reader who goes away ends the query. */
export const csvResponse = (viewer: Viewer, query: RecordListQuery): Response => {
  const { readable, writable } = new TransformStream<string, string>();
  const writer = writable.getWriter();
  const write = async (lines: string) => {
    await writer.ready;
    await writer.write(lines);
  };
  const run = async () => {
    await write(BYTE_ORDER_MARK);
    await exportRecords(scopeOf(viewer), query, viewer.timeZone, write);
    await writer.close();
  };
  run().catch((error: unknown) => {
    // Also the way a reader's leaving shows itself; the file then ends short, never as if it were whole.
    log.warn({ err: error }, 'export ended early');
    return writer.abort(error).catch(() => undefined);
  });
  return new Response(readable.pipeThrough(new TextEncoderStream()), {
    headers: {
      'content-type': 'text/csv; charset=utf-8',
      'content-disposition': `attachment; filename="${exportName(query, todayIn(viewer.timeZone))}"`,
      'cache-control': 'private, no-store',
    },
  });
};
