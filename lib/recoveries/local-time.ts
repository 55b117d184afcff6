import { Temporal } from 'temporal-polyfill';

const DAY = /^\d{4}-\d{2}-\d{2}$/;
const LOCAL = /^\d{4}-\d{2}-\d{2}[T ]\d{2}:\d{2}(:\d{2}(\.\d+)?)?$/;

/** When a recovery happened: the company's local date, and the instant when a time of day was stated. */
export type RecoveredWhen = { recoveredOn: string; recoveredAt: string | null };

const attempt = <T>(read: () => T): T | null => {
  try {
    return read();
  } catch (error) {
    if (error instanceof RangeError) return null;
    throw error;
  }
};

const atInstant = (instant: Temporal.Instant, timeZone: string): RecoveredWhen => ({
  recoveredOn: instant.toZonedDateTimeISO(timeZone).toPlainDate().toString(),
  recoveredAt: instant.toString(),
});

/**
 * Reads an ISO date, a local date-time, or one with an offset. A local time that the clock change skips moves on by the
 * skipped hour; one that comes twice is the first of the two. Null for anything else.
 */
export const readWhen = (text: string, timeZone: string): RecoveredWhen | null =>
  attempt(() => {
    const trimmed = text.trim();
    if (DAY.test(trimmed)) return { recoveredOn: Temporal.PlainDate.from(trimmed).toString(), recoveredAt: null };
    if (LOCAL.test(trimmed))
      return atInstant(Temporal.PlainDateTime.from(trimmed).toZonedDateTime(timeZone).toInstant(), timeZone);
    return atInstant(Temporal.Instant.from(trimmed), timeZone);
  });

/** The same as text: the local date and time, in UTC only where the local time comes twice. */
export const whenText = ({ recoveredOn, recoveredAt }: RecoveredWhen, timeZone: string): string => {
  if (recoveredAt === null) return recoveredOn;
  const instant = Temporal.Instant.from(recoveredAt);
  const local = instant.toZonedDateTimeISO(timeZone).toPlainDateTime();
  const unambiguous = attempt(() => local.toZonedDateTime(timeZone, { disambiguation: 'reject' })) !== null;
  return (unambiguous ? local : instant).toString({ smallestUnit: 'second' });
};

/** Today in the company's zone, `YYYY-MM-DD`. */
export const todayIn = (timeZone: string): string => Temporal.Now.plainDateISO(timeZone).toString();
