import { Readable } from 'node:stream';
import type { ReadableStream as WebStream } from 'node:stream/web';
import { withCompany } from '@/db/client';
import { withViewer } from '@/lib/api/route';
import { scopeOf } from '@/lib/auth/viewer';
import { rejectedCsv } from '@/lib/imports/rejected-csv';
import { requireImport } from '@/lib/imports/view';

export const dynamic = 'force-dynamic';

/** The refused rows as they came, with the reasons, to be mended and fed in again. */
export const GET = withViewer(
  'imports:manage',
  async (_request, viewer, { params }: RouteContext<'/api/imports/[id]/rejected.csv'>) => {
    const { id } = await params;
    await withCompany(scopeOf(viewer), (tx) => requireImport(tx, id));
    const text = Readable.from(rejectedCsv(scopeOf(viewer), id)).map((piece: string) => Buffer.from(piece));
    // The web stream of a response and the one of node:stream/web are one thing under two type names.
    const body = Readable.toWeb(text) as WebStream<Uint8Array> as ReadableStream<Uint8Array>;
    return new Response(body, {
      headers: {
        'content-type': 'text/csv; charset=utf-8',
        'content-disposition': 'attachment; filename="refused-rows.csv"',
        'cache-control': 'private, no-store',
      },
    });
  },
);
