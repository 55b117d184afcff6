/** Most characters of a note on a flag. No imports: the browser reads this too. */
export const FLAG_NOTE_LENGTH = 500;
