import { serverPool } from '@/db/client';
import packageJson from '@/package.json';

export const dynamic = 'force-dynamic';

/** 200 only when the database answers. */
export const GET = async (): Promise<Response> => {
  const database = await serverPool()
    .query('select 1')
    .then(() => 'ok' as const)
    .catch(() => 'unreachable' as const);
  const ok = database === 'ok';
  return Response.json(
    { status: ok ? 'ok' : 'failing', database, version: packageJson.version },
    { status: ok ? 200 : 503, headers: { 'cache-control': 'no-store' } },
  );
};
