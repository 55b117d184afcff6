/** Errors of Node's sockets when the other side is gone. */
const SOCKET_CODES = new Set(['ECONNREFUSED', 'ECONNRESET', 'EPIPE', 'ETIMEDOUT', 'EHOSTUNREACH', 'ENOTFOUND']);
/** PostgreSQL 15 appendix A: class 08 connection exceptions, 57P01 to 57P05 shut-downs and terminated sessions. */
const DATABASE_CODES = /^(08...|57P0[1-5])$/;
/** node-postgres has no code for these. */
const MESSAGES = /connection terminated|client has encountered a connection error|connection ended|not queryable/i;

/** Whether the database went away while something was done, which says nothing against what was done. */
export const isConnectionLoss = (error: unknown): boolean => {
  if (!(error instanceof Error)) return false;
  if (error instanceof AggregateError && error.errors.some(isConnectionLoss)) return true;
  const code = 'code' in error ? String(error.code) : '';
  if (SOCKET_CODES.has(code) || DATABASE_CODES.test(code) || MESSAGES.test(error.message)) return true;
  return error.cause !== undefined && isConnectionLoss(error.cause);
};
