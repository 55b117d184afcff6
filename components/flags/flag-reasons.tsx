import type { FlagReason } from '@/analytics/flags/contract';
import { formatCertainty } from '@/analytics/flags/sentence';
import { RULE_QUESTIONS } from '@/lib/flags/words';

/** The reasons of a record, the surest first: what is asked, how sure, and the evidence in words. */
export const FlagReasons = ({ reasons }: { reasons: readonly FlagReason[] }) => (
  <ul className="flex min-w-0 flex-col gap-2.5">
    {reasons.map((reason) => (
      <li key={reason.id} className="min-w-0">
        <p className="flex flex-wrap items-baseline gap-x-2.5">
          <span className="font-semibold">{RULE_QUESTIONS[reason.rule]}</span>
          <span className="font-mono text-sm text-ink-2">{formatCertainty(reason.certainty)}</span>
        </p>
        <p className="max-w-prose text-sm text-ink-2">{reason.explanation}</p>
      </li>
    ))}
  </ul>
);
