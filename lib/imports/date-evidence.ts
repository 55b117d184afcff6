import type { Question } from './contract';
import { parseDateText, type YearSpan } from './date-text';
import type { Evidenced } from './encoding';
import { DATE_ORDERS, type DateOrder } from './fields';
import { countText, listWords } from './text';

const SAID: Record<DateOrder, string> = {
  ymd: 'year, month, day',
  dmy: 'day, month, year',
  mdy: 'month, day, year',
};

// Reads the same in every order.
const YEAR_FIRST = /^\d{4}\D/;

/** What a column's dates say about their order, gathered over the whole file. */
export class DateEvidence {
  /** Dates that some orders read and others don't, or read differently. */
  private telling = 0;
  private readonly reads: Record<DateOrder, number> = { ymd: 0, dmy: 0, mdy: 0 };
  /** For each order the first date that it can't read although another can. */
  private readonly against: Partial<Record<DateOrder, string>> = {};
  /** The first date that is one day in one order and another in another. */
  private firstOpen: string | null = null;
  /** Pairs of orders that made different days of the same date. */
  private readonly apart = new Set<string>();

  constructor(private readonly span: YearSpan) {}

  add(text: string): void {
    if (YEAR_FIRST.test(text)) return;
    const dates = DATE_ORDERS.map((order) => parseDateText(text, order, this.span)?.date ?? null);
    const distinct = new Set(dates);
    if (distinct.size === 1) return;
    this.telling += 1;
    DATE_ORDERS.forEach((order, i) => {
      if (dates[i]) this.reads[order] += 1;
      else this.against[order] ??= text;
    });
    if (distinct.size - (distinct.has(null) ? 1 : 0) < 2) return;
    this.firstOpen ??= text;
    for (const [i, a] of DATE_ORDERS.entries())
      for (const [j, b] of DATE_ORDERS.entries())
        if (dates[i] && dates[j] && dates[i] !== dates[j]) this.apart.add(`${a} ${b}`);
  }

  /** The order, or null when the dates leave it open. Dates that read the same in every order need none. */
  decide(): Evidenced<DateOrder> | null {
    if (this.telling === 0) return { value: 'ymd', evidence: 'Every date begins with its year or names its month.' };
    const fitting = DATE_ORDERS.filter((order) => this.reads[order] === this.telling);
    const [only, ...others] = fitting;
    if (!only || others.some((order) => this.apart.has(`${only} ${order}`))) return null;
    if (others.length) return { value: only, evidence: 'Day and month are the same number in every date.' };
    const proofs = new Set(DATE_ORDERS.flatMap((order) => (order === only ? [] : (this.against[order] ?? []))));
    const examples = listWords(
      [...proofs].map((text) => `“${text}”`),
      'and',
    );
    return {
      value: only,
      evidence: `Only ${SAID[only]} reads all ${countText(this.telling)} dates, as in ${examples}.`,
    };
  }

  /** What to ask when the order stays open. */
  question(header: string): Question {
    const fitting = DATE_ORDERS.filter((order) => this.reads[order] === this.telling);
    const conflict = fitting.length === 0;
    const orders = conflict ? DATE_ORDERS.filter((order) => this.reads[order] > 0) : fitting;
    const example = this.firstOpen ?? '';
    const sentence = conflict
      ? `The dates in “${header}” follow no single order. Which is right? Rows that do not fit it will be refused.`
      : `The dates in “${header}” can be read in ${orders.length} ways. In which order are they written?`;
    return {
      about: 'dateOrder',
      header,
      field: null,
      sentence,
      choices: orders.map((value) => ({ value, label: this.label(value, example) })),
    };
  }

  private label(order: DateOrder, example: string): string {
    const date = parseDateText(example, order, this.span)?.date;
    const meaning = date ? `: “${example}” is ${longDate(date)}` : `: fits ${countText(this.reads[order])} dates`;
    return `${SAID[order].replace(/^./, (letter) => letter.toUpperCase())}${meaning}`;
  }
}

const longDate = (date: string): string =>
  new Date(`${date}T00:00:00Z`).toLocaleDateString('en-US', {
    day: 'numeric',
    month: 'long',
    year: 'numeric',
    timeZone: 'UTC',
  });
