import { judgeRecords } from '@/analytics/judging/judge-records';
import type { Judgement } from '@/analytics/judging/judgement';
import type { JudgedCylinder, JudgedRecord } from '@/analytics/judging/record';
import type { FlagRule } from '@/lib/vocabulary';
import { SETTINGS, usualWork } from '../../support/judged-records';

/** The flags of one record among a crew's usual work and what else is said. */
export const flagsOf = (
  record: JudgedRecord,
  others: readonly JudgedRecord[] = [],
  cylinders: readonly JudgedCylinder[] = [],
  usual: readonly JudgedRecord[] = usualWork(),
): Judgement[] =>
  judgeRecords([...usual, ...others, record], cylinders, SETTINGS).flags.filter(
    ({ recordId }) => recordId === record.id,
  );

/** The flag of this rule; fails where there is none. */
export const flag = <Rule extends FlagRule>(flags: readonly Judgement[], rule: Rule): Judgement & { rule: Rule } => {
  const found = flags.find((one): one is Judgement & { rule: Rule } => one.rule === rule);
  if (!found) throw new Error(`No ${rule} among: ${flags.map((one) => one.rule).join(', ') || 'no flags'}`);
  return found;
};

export const rulesOf = (flags: readonly Judgement[]): FlagRule[] => flags.map(({ rule }) => rule);
