import type { ColumnProfile } from './column-profile';
import type { Mapping, Question } from './contract';
import type { Evidenced } from './encoding';
import type { DateOrder, DecimalMark } from './fields';

/** How one column is read: the decisions the person said or the cells prove; null where none is needed or it is asked. */
export type ColumnDecision = {
  profile: ColumnProfile;
  dateOrder: Evidenced<DateOrder> | null;
  decimalMark: Evidenced<DecimalMark> | null;
};

const told = <Value>(value: Value | undefined): Evidenced<Value> | null =>
  value === undefined ? null : { value, evidence: 'You said so.' };
const remembered = <Value>(value: Value | undefined): Evidenced<Value> | null =>
  value === undefined ? null : { value, evidence: 'You said so for the last file with these columns.' };

/** The one mark that all columns with proof agree on, or null. */
const agreedMark = (marks: (DecimalMark | undefined)[]): DecimalMark | null => {
  const distinct = new Set(marks.filter((mark) => mark !== undefined));
  const [only] = distinct;
  return distinct.size === 1 && only ? only : null;
};

/**
 * Decides date orders and decimal marks. What the person says now goes first, then proof in the column, then what he said
 * for the same headers before, then the other columns; what still stands open is asked.
 */
export const decideColumns = (
  profiles: readonly ColumnProfile[],
  typed: ReadonlySet<number>,
  said: Mapping,
  saidBefore: Mapping | null,
): { decisions: ColumnDecision[]; questions: Question[] } => {
  const questions: Question[] = [];
  const agreed = agreedMark(profiles.map(({ numbers }) => numbers?.proven()?.value));

  const dateOrderOf = ({ dates, column: { header } }: ColumnProfile) => {
    if (!dates) return null;
    const decided =
      told(said.dateOrders?.[header]) ?? dates.decide() ?? remembered(saidBefore?.dateOrders?.[header]) ?? null;
    if (!decided) questions.push(dates.question(header));
    return decided;
  };

  const decimalMarkOf = ({ numbers, filled, column: { header, index } }: ColumnProfile) => {
    if (!numbers || filled === 0) return null;
    const decided =
      told(said.decimalMarks?.[header]) ??
      (typed.has(index) ? { value: 'point' as const, evidence: 'Excel itself keeps these as numbers.' } : null) ??
      numbers.proven() ??
      remembered(saidBefore?.decimalMarks?.[header]) ??
      (numbers.isWhole() ? { value: agreed ?? 'point', evidence: 'All are whole numbers.' } : null) ??
      (agreed ? numbers.follow(agreed) : null);
    if (!decided) questions.push(numbers.question(header));
    return decided;
  };

  const decisions = profiles.map((profile) => ({
    profile,
    dateOrder: dateOrderOf(profile),
    decimalMark: decimalMarkOf(profile),
  }));
  return { decisions, questions };
};
