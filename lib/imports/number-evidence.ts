import type { Question } from './contract';
import type { Evidenced } from './encoding';
import type { DecimalMark } from './fields';
import { countText } from './text';

const SIGN: Record<DecimalMark, string> = { point: '.', comma: ',' };
const NAME: Record<DecimalMark, string> = { point: 'decimal point', comma: 'decimal comma' };

/** Reads a cell under a decimal mark as canonical text, null when it can't. */
export type ReadAmount = (text: string, mark: DecimalMark) => string | null;

/** What a column's numbers say about their decimal mark, gathered over the whole file. */
export class NumberEvidence {
  private readonly proofs: Record<DecimalMark, { count: number; example: string }> = {
    point: { count: 0, example: '' },
    comma: { count: 0, example: '' },
  };
  /** The first number that means one thing with a point and another with a comma: `1,234`. */
  private open: { text: string; point: string; comma: string } | null = null;

  constructor(private readonly read: ReadAmount) {}

  add(text: string): void {
    const point = this.read(text, 'point');
    const comma = this.read(text, 'comma');
    if (point === comma) return;
    if (point !== null && comma !== null) this.open ??= { text, point, comma };
    else {
      const proof = this.proofs[point === null ? 'comma' : 'point'];
      if (proof.count === 0) proof.example = text;
      proof.count += 1;
    }
  }

  /** The mark that the column itself proves; null when it proves none or both. */
  proven(): Evidenced<DecimalMark> | null {
    const { point, comma } = this.proofs;
    if (point.count > 0 === comma.count > 0) return null;
    const value = point.count > 0 ? 'point' : 'comma';
    const { count, example } = this.proofs[value];
    const numbers = count === 1 ? 'One number has' : `${countText(count)} numbers have`;
    return { value, evidence: `${numbers} a ${NAME[value]}, as in “${example}”.` };
  }

  /** Whether the column's numbers read the same either way. */
  isWhole(): boolean {
    return this.open === null && this.proofs.point.count === 0 && this.proofs.comma.count === 0;
  }

  /** The mark that other columns prove, where this column's open numbers use that same sign. */
  follow(others: DecimalMark): Evidenced<DecimalMark> | null {
    if (this.hasBoth() || !this.open?.text.includes(SIGN[others])) return null;
    return { value: others, evidence: `The other columns have a ${NAME[others]}.` };
  }

  hasBoth(): boolean {
    return this.proofs.point.count > 0 && this.proofs.comma.count > 0;
  }

  /** What to ask when the mark stays open. */
  question(header: string): Question {
    const { point, comma } = this.proofs;
    const text = this.open?.text ?? '';
    const sentence = this.hasBoth()
      ? `“${header}” has numbers with a decimal point (“${point.example}”) and with a decimal comma (“${comma.example}”). Which is right? The others will be refused.`
      : `Is “${text}” in “${header}” a number with decimals, or are thousands set apart?`;
    const label = (mark: DecimalMark) =>
      this.open && !this.hasBoth()
        ? `${sentenceCase(NAME[mark])}: “${text}” is ${this.open[mark]}`
        : sentenceCase(NAME[mark]);
    return {
      about: 'decimalMark',
      header,
      field: null,
      sentence,
      choices: (['point', 'comma'] as const).map((value) => ({ value, label: label(value) })),
    };
  }
}

const sentenceCase = (text: string) => text.replace(/^./, (letter) => letter.toUpperCase());
