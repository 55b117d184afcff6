// Spaces of every kind, control characters included: a cell is one line of text to the product.
const SPACE = /[\s\p{Cc}\u200b]+/gu;
// Nearly every cell is plain ASCII with single spaces, and clean as it stands.
const UNCLEAN = /[^ -~]|^ | $| {2}/;

/** One spelling of a text: composed letters (NFC), no space around it, one space inside for any white space. */
export const cleanText = (text: string): string =>
  UNCLEAN.test(text) ? text.normalize('NFC').replace(SPACE, ' ').trim() : text;

const BLANK_WORDS = new Set(['-', '--', '–', '—', 'n/a', '#n/a', 'null', 'none']);
const LONGEST_BLANK_WORD = Math.max(...[...BLANK_WORDS].map((word) => word.length));

/** Whether a cell of a number, date or word says nothing; offices write a dash or `n/a` for that. */
export const isBlankWord = (text: string): boolean =>
  text.length <= LONGEST_BLANK_WORD && (text === '' || BLANK_WORDS.has(text.toLowerCase()));

/** The mark that decoders leave where a letter was lost. */
export const hasLostLetter = (text: string): boolean => text.includes('\ufffd');

/** “One, two or three”. */
export const listWords = (words: readonly string[], last: 'and' | 'or'): string =>
  words.length < 2 ? words.join('') : `${words.slice(0, -1).join(', ')} ${last} ${words.at(-1)}`;

/** `1,234` for sentences. */
export const countText = (count: number): string => count.toLocaleString('en-US');
