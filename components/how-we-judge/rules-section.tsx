import { Sheet } from '@/components/ui/sheet';
import { RULE_QUESTIONS } from '@/lib/flags/words';
import type { JudgingRule } from './rule';

/** Some rules, each with what it looks at, what it does not mean, and where it comes from. */
export const RulesSection = ({ id, title, rules }: { id: string; title: string; rules: readonly JudgingRule[] }) => (
  <Sheet title={<span id={id}>{title}</span>}>
    <dl className="grid gap-x-10 gap-y-6 md:grid-cols-2">
      {rules.map(({ rule, looksAt, doesNotMean, source }) => (
        <div key={rule} id={rule} className="max-w-prose">
          <dt className="font-semibold">{RULE_QUESTIONS[rule]}</dt>
          <dd className="mt-1">{looksAt}</dd>
          <dd className="mt-1.5 text-ink-2">{doesNotMean}</dd>
          <dd className="mt-1.5 text-sm text-ink-3">{source}</dd>
        </div>
      ))}
    </dl>
  </Sheet>
);
