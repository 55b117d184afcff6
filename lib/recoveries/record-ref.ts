import 'server-only';
import { DatabaseError } from 'pg';
import { AppError } from '@/lib/errors';

const isTakenRef = (error: unknown): boolean => {
  const cause = error instanceof Error ? error.cause : undefined;
  return cause instanceof DatabaseError && cause.constraint === 'recoveries_record_ref';
};

/** Runs a write; throws 409 at `recordRef` when the ref belongs to another record of the company. */
export const refusingTakenRef = <T>(recordRef: string, write: () => Promise<T>): Promise<T> =>
  write().catch((error: unknown) => {
    if (!isTakenRef(error)) throw error;
    const message = `${recordRef} is already on record. Correct that record, or use another ref`;
    throw new AppError(409, 'Already on record', message, [{ path: 'recordRef', message }], { cause: error });
  });
