/*
 * A spreadsheet runs a cell that begins with one of these as a formula (OWASP, CSV Injection). An apostrophe in front
 * makes it text. Plain numbers are left alone: -3.5 is a number and must stay one. The two functions undo each other
 * exactly, also for text that begins with an apostrophe of its own.
 */
const STARTS_FORMULA = /^'*[=+\-@\t\r]/;
const PLAIN_NUMBER = /^[+-]?(?:\d+(?:[.,]\d*)?|[.,]\d+)$/;

const isDangerous = (text: string) => STARTS_FORMULA.test(text) && !PLAIN_NUMBER.test(text);

/** The text as it may stand in a file that people open in a spreadsheet. */
export const toFormulaSafe = (text: string): string => (isDangerous(text) ? `'${text}` : text);

/** The text that `toFormulaSafe` was given. */
export const fromFormulaSafe = (text: string): string =>
  text.startsWith("'") && isDangerous(text.slice(1)) ? text.slice(1) : text;
