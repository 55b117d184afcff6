import { badInput } from '@/lib/errors';

const LONGEST = 255;

/** The Idempotency-Key of a request, null when it has none; throws 400 for one that is empty or too long. */
export const idempotencyKeyOf = (request: Request): string | null => {
  const key = request.headers.get('idempotency-key');
  if (key !== null && (key === '' || key.length > LONGEST))
    throw badInput([{ path: 'Idempotency-Key', message: `Expected 1 to ${LONGEST} characters` }]);
  return key;
};
