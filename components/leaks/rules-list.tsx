'use client';

import type { ApplianceLeaks } from '@/analytics/leak-rate/contract';
import { useStateSubsector } from '@/analytics/leak-rate/hook';
import { ruleSentence } from '@/analytics/leak-rate/sentence';
import { TextButton } from '@/components/ui/button';
import { useMay } from '@/components/viewer-context';
import { formatPercent } from '@/lib/format';
import type { DisplayUnit } from '@/lib/vocabulary';
import { CATEGORY_NAMES } from '@/lib/wording';

const CHOICES = [
  { value: true, text: 'It is residential or light commercial' },
  { value: false, text: 'It is not' },
] as const;

/** Asks, or lets it be changed, whether the unit is of the subsector that part 84 leaves out. */
const Subsector = ({ leaks }: { leaks: ApplianceLeaks }) => {
  const { mutate, error, isPending } = useStateSubsector(leaks.applianceId);
  return (
    <p className="mt-1 flex flex-wrap gap-x-4 text-sm print:hidden">
      {CHOICES.filter(({ value }) => value !== leaks.lightCommercial).map(({ value, text }) => (
        <TextButton key={text} disabled={isPending} onClick={() => mutate(value)}>
          {text}
        </TextButton>
      ))}
      {error ? (
        <span role="alert" className="font-medium text-danger">
          {error.message}
        </span>
      ) : null}
    </p>
  );
};

/** Which leak repair rules hold for the unit, with paragraph and date, and what decides. */
export const RulesList = ({ leaks, unit }: { leaks: ApplianceLeaks; unit: DisplayUnit }) => {
  const mayWrite = useMay('leaks:write');
  const { rules, trigger, category } = leaks;
  return (
    <div className="mt-4 max-w-prose">
      <h3 className="font-semibold">Which rule holds</h3>
      <ul className="mt-1 flex flex-col gap-1">
        {rules.map((rule) => (
          <li key={rule.paragraph}>
            {ruleSentence(rule, unit)}
            {rule.why.startsWith('light_commercial') || (rule.rule === 'hfc' && leaks.lightCommercial === false) ? (
              mayWrite ? (
                <Subsector leaks={leaks} />
              ) : null
            ) : null}
          </li>
        ))}
      </ul>
      <p className="mt-2 text-sm text-ink-2">
        {trigger !== null && category !== null
          ? `Leaks of ${CATEGORY_NAMES[category]} must be repaired above ${formatPercent(trigger / 100)}. `
          : 'No record says what kind of appliance this is, so no trigger is set beside its rates. '}
        Rates rest on the additions written down here and on the full charge that most records of the unit state. This
        is arithmetic, no legal advice: the regulation and the authority decide.
      </p>
    </div>
  );
};
