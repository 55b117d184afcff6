import { Temporal } from 'temporal-polyfill';

/** When a recovery happened: the company's local date, and the instant when a time of day was stated. */
export type RecoveredWhen = { recoveredOn: string; recoveredAt: string | null };

const isUnambiguous = (local: Temporal.PlainDateTime, timeZone: string): boolean => {
  try {
    local.toZonedDateTime(timeZone, { disambiguation: 'reject' });
    return true;
  } catch (error) {
    if (error instanceof RangeError) return false;
    throw error;
  }
};

/**
 * The local date, or date and time, as somebody types it; in UTC only where the clocks go back and the local time comes
 * twice.
 */
export const whenText = ({ recoveredOn, recoveredAt }: RecoveredWhen, timeZone: string): string => {
  if (recoveredAt === null) return recoveredOn;
  const instant = Temporal.Instant.from(recoveredAt);
  const local = instant.toZonedDateTimeISO(timeZone).toPlainDateTime();
  return (isUnambiguous(local, timeZone) ? local : instant).toString({ smallestUnit: 'second' });
};

/** Today in the company's zone, `YYYY-MM-DD`. */
export const todayIn = (timeZone: string): string => Temporal.Now.plainDateISO(timeZone).toString();
