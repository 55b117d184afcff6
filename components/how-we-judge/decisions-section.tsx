import { Sheet } from '@/components/ui/sheet';
import { DECISION_WORDS } from '@/lib/flags/words';
import { FLAG_DECISIONS } from '@/lib/vocabulary';

/** What can be decided, and what follows from it. */
export const DecisionsSection = () => (
  <Sheet title="What follows from a decision">
    <dl className="grid gap-x-10 gap-y-2 md:grid-cols-2">
      {FLAG_DECISIONS.map((decision) => (
        <div key={decision} className="flex flex-wrap justify-between gap-x-4 border-b border-rule-2 py-1.5">
          <dt className="font-medium">{DECISION_WORDS[decision].name}</dt>
          <dd className="text-ink-2">{DECISION_WORDS[decision].follows}</dd>
        </div>
      ))}
    </dl>
    <p className="mt-3 max-w-prose">
      A decision says what the whole record was and closes all of its open flags. Who decided what and when stays for
      good, and every decision can be taken back: reopening restores the figures exactly.
    </p>
  </Sheet>
);
