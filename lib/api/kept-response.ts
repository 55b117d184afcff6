import 'server-only';
import type { AskingViewer } from '@/lib/auth/viewer';
import { type KeptAnswer, keptAnswer } from './kept-answers';

/** A kept answer, compressed where that is taken; 304 without a body to whoever says that he holds it already. */
const keptResponse = (request: Request, { etag, body, gzipped }: KeptAnswer): Response => {
  const headers = new Headers({ etag, 'cache-control': 'private, no-store', vary: 'accept-encoding' });
  if (request.headers.get('if-none-match')?.includes(etag)) return new Response(null, { status: 304, headers });
  headers.set('content-type', 'application/json');
  if (!/\bgzip\b/.test(request.headers.get('accept-encoding') ?? '')) return new Response(body, { headers });
  headers.set('content-encoding', 'gzip');
  return new Response(gzipped, { headers });
};

/**
 * The answer to a question as JSON, computed once for each state of the company's records. `question` must name
 * everything that the answer depends on besides the records and who asks.
 */
export const keptJson = async (
  request: Request,
  viewer: AskingViewer,
  question: string,
  compute: () => Promise<unknown>,
): Promise<Response> =>
  keptResponse(request, await keptAnswer(viewer, question, async () => JSON.stringify(await compute())));
