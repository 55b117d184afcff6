'use client';

import { type FormEvent, useState } from 'react';
import type { SiteMethod } from '@/analytics/leak-rate/contract';
import { useChooseMethod } from '@/analytics/leak-rate/hook';
import { METHOD_MEANINGS } from '@/analytics/leak-rate/sentence';
import { Button, TextButton } from '@/components/ui/button';
import { Field, TextInput } from '@/components/ui/field';
import { useMay, useViewer } from '@/components/viewer-context';
import { formatInstant } from '@/lib/format';
import { LEAK_RATE_METHODS, type LeakRateMethod } from '@/lib/vocabulary';
import { LEAK_RATE_METHOD_NAMES } from '@/lib/wording';

type ChoiceProps = { siteId: string; method: SiteMethod; onDone: () => void };

const ChoiceForm = ({ siteId, method, onDone }: ChoiceProps) => {
  const [chosen, setChosen] = useState<LeakRateMethod>(method.method ?? 'annualizing');
  const [why, setWhy] = useState('');
  const { mutate, error, isPending } = useChooseMethod(siteId);
  const submit = (event: FormEvent) => {
    event.preventDefault();
    mutate({ method: chosen, version: method.version, why }, { onSuccess: onDone });
  };
  return (
    <form onSubmit={submit} noValidate className="grid max-w-2xl gap-3 border-t-2 border-ink pt-3 print:hidden">
      <fieldset>
        <legend className="font-medium">One method for every appliance of this site</legend>
        {LEAK_RATE_METHODS.map((word) => (
          <label key={word} className="flex min-h-11 items-start gap-3 py-1.5">
            <input
              type="radio"
              name="method"
              className="mt-1 size-5 shrink-0 accent-act"
              checked={chosen === word}
              onChange={() => setChosen(word)}
            />
            <span>
              {LEAK_RATE_METHOD_NAMES[word]}
              <span className="block text-sm text-ink-2">{METHOD_MEANINGS[word]}</span>
            </span>
          </label>
        ))}
      </fieldset>
      {method.method ? (
        <Field label="Why it changes" required error={error?.message}>
          <TextInput value={why} onChange={(event) => setWhy(event.target.value)} />
        </Field>
      ) : error ? (
        <p role="alert" className="text-sm font-medium text-danger">
          {error.message}
        </p>
      ) : null}
      <div className="flex flex-wrap gap-3">
        <Button type="submit" tone="primary" disabled={isPending}>
          {isPending ? 'Saving' : 'Keep to this method'}
        </Button>
        <Button onClick={onDone}>Leave it</Button>
      </div>
    </form>
  );
};

/** By which method the site's leak rates are computed, who chose it, and the form to choose. */
export const MethodChoice = ({ siteId, method }: { siteId: string; method: SiteMethod }) => {
  const mayWrite = useMay('leaks:write');
  const { timeZone } = useViewer();
  const [open, setOpen] = useState(false);
  const [last] = method.history;
  return (
    <div className="mt-5 max-w-prose">
      <h3 className="font-semibold">Method of this site</h3>
      <p>
        {method.method
          ? `Leak rates of this site go by the ${LEAK_RATE_METHOD_NAMES[method.method]}.`
          : 'Nobody has chosen a method for this site yet; the annualizing method is shown. 40 CFR 82.152 wants one method for all appliances of a facility.'}
      </p>
      {last ? (
        <ul className="text-sm text-ink-2">
          {method.history.map(({ changedAt, who, why, method: chosen }) => (
            <li key={changedAt}>
              {formatInstant(changedAt, timeZone)}, {who}: {LEAK_RATE_METHOD_NAMES[chosen]}
              {why ? ` (${why})` : ''}
            </li>
          ))}
        </ul>
      ) : null}
      {mayWrite && !open ? (
        <TextButton className="mt-1 text-sm print:hidden" onClick={() => setOpen(true)}>
          {method.method ? 'Change the method' : 'Choose a method'}
        </TextButton>
      ) : null}
      {open ? <ChoiceForm siteId={siteId} method={method} onDone={() => setOpen(false)} /> : null}
    </div>
  );
};
