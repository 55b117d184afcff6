import { Temporal } from 'temporal-polyfill';
import type { DateText } from './date-text';

const DAYS_KEPT = 10_000;

/** The local day and the instant of a written date in the zone it was made for. */
export type ToLocalTime = (date: DateText) => { on: string; at: string | null };

/**
 * Makes a reader of local times in `timeZone`. The offset of a day without a clock change is kept, since files have many
 * rows a day and asking the zone anew is the dearest step of reading a row.
 */
export const localTime = (timeZone: string): ToLocalTime => {
  const offsets = new Map<string, string | null>();
  const offsetOfDay = (date: string): string | null => {
    const known = offsets.get(date);
    if (known !== undefined) return known;
    const day = Temporal.PlainDate.from(date);
    const [from, to] = [day.toZonedDateTime(timeZone), day.add({ days: 1 }).toZonedDateTime(timeZone)];
    const offset = from.offset === to.offset ? from.offset : null;
    if (offsets.size >= DAYS_KEPT) offsets.clear();
    offsets.set(date, offset);
    return offset;
  };
  return ({ date, time, offset }) => {
    if (time === null) return { on: date, at: null };
    const usual = offset ? null : offsetOfDay(date);
    if (usual) return { on: date, at: `${date}T${time}${usual}` };
    const instant = offset
      ? Temporal.Instant.from(`${date}T${time}${offset}`).toZonedDateTimeISO(timeZone)
      : Temporal.PlainDateTime.from(`${date}T${time}`).toZonedDateTime(timeZone);
    return { on: instant.toPlainDate().toString(), at: instant.toString({ timeZoneName: 'never' }) };
  };
};
