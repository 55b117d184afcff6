import type { DecimalMark } from './fields';
import { cleanText } from './text';

// Thousands are grouped by the other mark, a space or an apostrophe; a group never begins with a zero, so that `0.985`
// can't be taken for a grouped whole number.
const SHAPES: Record<DecimalMark, RegExp> = {
  point: /^([+-]?)(\d+|[1-9]\d{0,2}(?:([, '’])\d{3})(?:\3\d{3})*)?(?:\.(\d+))?$/,
  comma: /^([+-]?)(\d+|[1-9]\d{0,2}(?:([. '’])\d{3})(?:\3\d{3})*)?(?:,(\d+))?$/,
};

/**
 * A written number as plain decimal text (`-1234.5`), read with the given decimal mark; null for what is no number under
 * it. Groups of thousands may be set apart by the other mark, a space or an apostrophe.
 */
export const parseDecimal = (text: string, mark: DecimalMark): string | null => {
  const match = SHAPES[mark].exec(cleanText(text).replace('−', '-'));
  if (!match) return null;
  const [, sign = '', whole, , fraction] = match;
  if (whole === undefined && fraction === undefined) return null;
  const digits = (whole ?? '0').replace(/\D/g, '').replace(/^0+(?=\d)/, '');
  return `${sign === '-' ? '-' : ''}${digits}${fraction ? `.${fraction}` : ''}`;
};

/** Decimals of plain decimal text. */
export const decimalsOf = (decimal: string): number => {
  const point = decimal.indexOf('.');
  return point < 0 ? 0 : decimal.length - point - 1;
};

const WITH_UNIT = /^([-+−]?[\d.,\s'’]*\d)\s*([a-zµμ"][a-zµμ. ]*)$/i;

/** `8.2 lb` as its number and its word; a cell without a word comes back whole. */
export const splitNumberAndUnit = (text: string): [number: string, word: string] => {
  const match = WITH_UNIT.exec(text);
  return match ? [match[1] ?? '', match[2] ?? ''] : [text, ''];
};
