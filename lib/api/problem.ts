import type { ZodError } from 'zod';
import { AppError, badInput, type FieldError } from '@/lib/errors';

/** Where each fault of a zod check lies and what would be right. */
export const fieldErrors = (error: ZodError): FieldError[] =>
  error.issues.map((issue) => ({ path: issue.path.join('.'), message: issue.message }));

/** Throws 400 with every fault named. */
export const throwBadInput = (error: ZodError): never => {
  throw badInput(fieldErrors(error));
};

/** Any error as application/problem+json (RFC 9457); what is not meant for the caller becomes a general sentence. */
export const problemResponse = (error: unknown): Response => {
  const known =
    error instanceof AppError
      ? error
      : new AppError(
          500,
          'Something failed here',
          'The fault is on our side and has been logged. Try again in a moment.',
        );
  const headers = new Headers({ 'content-type': 'application/problem+json', 'cache-control': 'no-store' });
  if (known.retryAfterSeconds) headers.set('retry-after', String(known.retryAfterSeconds));
  if (known.status === 401) headers.set('www-authenticate', 'Bearer');
  const body = {
    type: 'about:blank',
    title: known.title,
    status: known.status,
    detail: known.message,
    ...(known.errors.length ? { errors: known.errors } : {}),
  };
  return new Response(JSON.stringify(body), { status: known.status, headers });
};
