/** Most characters of a note: it stands beside a chart, not instead of a report. No imports: the browser reads this too. */
export const NOTE_LENGTH = 500;
