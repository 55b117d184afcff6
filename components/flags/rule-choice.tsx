import { clsx } from 'clsx';
import type { FlagsList } from '@/analytics/flags/contract';
import { RULE_QUESTIONS } from '@/lib/flags/words';
import { formatCount } from '@/lib/format';
import type { FlagRule } from '@/lib/vocabulary';

type RuleChoiceProps = {
  byRule: FlagsList['open']['byRule'];
  rules: readonly FlagRule[];
  onChange: (rules: FlagRule[]) => void;
};

/** The rules with open flags and how many each has; pressed ones narrow the list. */
export const RuleChoice = ({ byRule, rules, onChange }: RuleChoiceProps) => (
  <fieldset className="-mx-1 mb-1 flex min-w-0 gap-2 overflow-x-auto px-1 pb-2 sm:flex-wrap print:hidden">
    <legend className="sr-only">Show only these reasons</legend>
    {byRule.map(({ rule, flags }) => {
      const pressed = rules.includes(rule);
      return (
        <button
          key={rule}
          type="button"
          aria-pressed={pressed}
          onClick={() => onChange(pressed ? rules.filter((other) => other !== rule) : [...rules, rule])}
          className={clsx(
            'min-h-11 shrink-0 border px-3 text-sm whitespace-nowrap pointer-fine:min-h-8',
            pressed ? 'border-ink bg-ink text-sheet' : 'border-edge bg-sheet hover:border-ink',
          )}
        >
          {RULE_QUESTIONS[rule]} <span className="font-mono">{formatCount(flags)}</span>
        </button>
      );
    })}
  </fieldset>
);
