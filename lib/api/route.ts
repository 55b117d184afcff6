import 'server-only';
import { randomUUID } from 'node:crypto';
import { parse as parseCookie } from 'node:querystring';
import type { z } from 'zod';
import { viewerOfAccessToken } from '@/lib/auth/access-tokens';
import { sessionTokenOf } from '@/lib/auth/current-viewer';
import { type Action, may } from '@/lib/auth/permissions';
import { viewerOfSession } from '@/lib/auth/sessions';
import type { AskingViewer, Viewer } from '@/lib/auth/viewer';
import { env } from '@/lib/env';
import { AppError, forbidden, unauthorized } from '@/lib/errors';
import { log } from '@/lib/log';
import type { Contract } from './contract';
import { keptJson } from './kept-response';
import { problemResponse, throwBadInput } from './problem';

const viewerOf = async (request: Request): Promise<AskingViewer> => {
  const bearer = request.headers.get('authorization')?.match(/^Bearer\s+(\S+)$/i)?.[1];
  if (bearer) return (await viewerOfAccessToken(bearer)) ?? raise(unauthorized());
  const jar = parseCookie(request.headers.get('cookie') ?? '', '; ', '=');
  const token = await sessionTokenOf((name) => (typeof jar[name] === 'string' ? jar[name] : undefined));
  if (!token) throw unauthorized();
  refuseForeignOrigin(request);
  return (await viewerOfSession(token)) ?? raise(unauthorized());
};

const raise = (error: Error): never => {
  throw error;
};

/** A browser writes only from our own pages: cookies are sent along from anywhere, the Origin header tells. */
const refuseForeignOrigin = (request: Request) => {
  if (request.method === 'GET' || request.method === 'HEAD') return;
  const origin = request.headers.get('origin');
  const own = [new URL(env().NEXTAUTH_URL).host, request.headers.get('host')];
  if (!origin || !URL.canParse(origin) || !own.includes(new URL(origin).host))
    throw new AppError(403, 'Foreign origin', 'Writes are taken only from this site’s own pages.');
};

/**
 * The outer shell of every handler: who asks, may he, and any error as problem+json. `handle` gets the viewer and gives
 * the response.
 */
export const withViewer =
  <Context>(action: Action, handle: (request: Request, viewer: AskingViewer, context: Context) => Promise<Response>) =>
  async (request: Request, context: Context): Promise<Response> => {
    const requestId = randomUUID();
    const began = performance.now();
    let response: Response;
    try {
      const viewer = await viewerOf(request);
      if (!may(viewer.role, action)) throw forbidden();
      response = await handle(request, viewer, context);
    } catch (error) {
      if (!(error instanceof AppError)) log.error({ requestId, err: error }, 'request failed');
      response = problemResponse(error);
    }
    response.headers.set('x-request-id', requestId);
    const ms = Math.round(performance.now() - began);
    log.debug(
      { requestId, method: request.method, path: new URL(request.url).pathname, status: response.status, ms },
      'request',
    );
    return response;
  };

/** Search parameters as zod sees them: one value as a string, repeated ones as an array. */
export const searchInput = (url: string): Record<string, string | string[]> => {
  const input: Record<string, string | string[]> = {};
  const params = new URL(url).searchParams;
  for (const key of new Set(params.keys())) {
    const values = params.getAll(key);
    input[key] = values.length === 1 ? (values[0] ?? '') : values;
  }
  return input;
};

/** JSON that is nobody else's to keep. */
export const json = (body: unknown, status = 200): Response =>
  Response.json(body, { status, headers: { 'cache-control': 'private, no-store' } });

/**
 * A reading route from its contract: parse the query, load, check the answer against the promise. For answers that
 * follow from the company's tracked records alone and cost something to compute: kept until one of them changes.
 */
export const getKeptRoute = <Query extends z.ZodType, Answer extends z.ZodType>(
  contract: Contract<Query, Answer>,
  load: (query: z.output<Query>, viewer: AskingViewer) => Promise<z.input<Answer>>,
) =>
  withViewer(contract.action, async (request, viewer) => {
    const query = contract.query.safeParse(searchInput(request.url));
    if (!query.success) return throwBadInput(query.error);
    const compute = async () => contract.response.parse(await load(query.data, viewer));
    return keptJson(request, viewer, `${contract.path} ${JSON.stringify(query.data)}`, compute);
  });

/** A reading route from its contract: parse the query, load, check the answer against the promise. */
export const getRoute = <Query extends z.ZodType, Answer extends z.ZodType>(
  contract: Contract<Query, Answer>,
  load: (query: z.output<Query>, viewer: Viewer) => Promise<z.input<Answer>>,
) =>
  withViewer(contract.action, async (request, viewer) => {
    const query = contract.query.safeParse(searchInput(request.url));
    if (!query.success) return throwBadInput(query.error);
    return json(contract.response.parse(await load(query.data, viewer)));
  });

/** The JSON body of a request, checked; throws 400 with every fault named. */
export const jsonBody = async <Body extends z.ZodType>(request: Request, schema: Body): Promise<z.output<Body>> => {
  const body: unknown = await request.json().catch(() => undefined);
  const result = schema.safeParse(body);
  return result.success ? result.data : throwBadInput(result.error);
};
