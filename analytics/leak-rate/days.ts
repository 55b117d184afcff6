const MS_PER_DAY = 86_400_000;

const numberOf = (day: string): number => {
  const ms = Date.parse(`${day}T00:00:00Z`);
  if (Number.isNaN(ms)) throw new RangeError(`No day: ${day}`);
  return ms / MS_PER_DAY;
};

/** Days from one local date to another, both `YYYY-MM-DD`; negative when `to` is earlier. Throws RangeError on no day. */
export const daysBetween = (from: string, to: string): number => numberOf(to) - numberOf(from);

/** The local date `days` days before. Throws RangeError on no day. */
export const daysBefore = (day: string, days: number): string =>
  new Date((numberOf(day) - days) * MS_PER_DAY).toISOString().slice(0, 10);
