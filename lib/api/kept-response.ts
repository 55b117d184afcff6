import 'server-only';
import type { AskingViewer } from '@/lib/auth/viewer';
import { type KeptAnswer, keptAnswer } from './kept-answers';

/**
 * A kept answer; 304 without a body to whoever says that he holds it already. It leaves uncompressed: Next drops the
 * `content-encoding` of a handler and compresses what it sends itself, so that a packed answer would be packed twice.
 */
const keptResponse = (request: Request, { etag, body }: KeptAnswer): Response => {
  const headers = new Headers({ etag, 'cache-control': 'private, no-store' });
  if (request.headers.get('if-none-match')?.includes(etag)) return new Response(null, { status: 304, headers });
  headers.set('content-type', 'application/json');
  return new Response(body, { headers });
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
