import type { FlagDecision, FlagRule } from '@/lib/vocabulary';

/** What a rule asks of a record: a question, since a flag is a reason to look. No imports but types: the browser reads this too. */
export const RULE_QUESTIONS: Record<FlagRule, string> = {
  stopped_early: 'Stopped early?',
  short_on_arrival: 'Short on arrival?',
  low_unexplained: 'Low without a reason?',
  unit_slip: 'Slip of unit or digit?',
  weights_disagree: 'Weights that disagree?',
  cylinder_chain: 'Another weight at the next pull?',
  over_full_charge: 'More than a full charge?',
  nameplate_doubtful: 'Wrong nameplate?',
  duplicate: 'Written twice?',
  level_not_reached: 'Level not reached?',
  hold_missing: 'No hold?',
  cylinder_overfilled: 'Cylinder overfilled?',
  wrong_cylinder: 'Wrong cylinder?',
  date_doubtful: 'Wrong date?',
};

/** What can be decided, in the order of the buttons. */
export const DECISION_WORDS: Record<FlagDecision, { name: string; follows: string }> = {
  leaked_before: { name: 'Leaked before', follows: 'does not count against the technician' },
  known_low_charge: { name: 'Known low charge', follows: 'does not count against the technician' },
  incomplete_recovery: { name: 'Incomplete recovery', follows: 'counts as it stands' },
  wrong_nameplate: { name: 'Wrong nameplate', follows: 'correct the record, then it is judged again' },
  entry_error: { name: 'Weighing or entry error', follows: 'leaves every figure until it is reopened' },
  confirmed_correct: { name: 'Confirmed correct', follows: 'counts as it stands' },
};
