import 'server-only';
import pino from 'pino';
import { env } from './env';

/** JSON lines on standard output; never a secret, never a person's record. */
export const log = pino({ level: env().LOG_LEVEL, base: null, timestamp: pino.stdTimeFunctions.isoTime });
