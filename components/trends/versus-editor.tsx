'use client';

import { type FormEvent, useState } from 'react';
import { monthsBefore } from '@/analytics/scope-address';
import { parseVersus, versusText } from '@/analytics/trends-comparison/versus';
import { Button } from '@/components/ui/button';
import { Field, TextInput } from '@/components/ui/field';

type Days = { from: string; to: string };

type VersusEditorProps = {
  /** The period being compared, in days; null when nothing is. */
  now: Days | null;
  versus: string | null;
  onApply: (versus: string | null) => void;
  close: () => void;
};

const monthCount = ({ from, to }: Days): number =>
  (Number(to.slice(0, 4)) - Number(from.slice(0, 4))) * 12 + Number(to.slice(5, 7)) - Number(from.slice(5, 7)) + 1;

const earlier = (now: Days, months: number): string =>
  versusText({ from: monthsBefore(now.from.slice(0, 7), months), to: monthsBefore(now.to.slice(0, 7), months) });

/** With what the period is compared: a year before, or any other months. */
export const VersusEditor = ({ now, versus, onApply, close }: VersusEditorProps) => {
  const chosen = versus ? parseVersus(versus) : null;
  const [from, setFrom] = useState(chosen?.from.slice(0, 7) ?? '');
  const [to, setTo] = useState(chosen?.to.slice(0, 7) ?? '');
  const [error, setError] = useState<string | null>(null);
  const apply = (text: string | null) => {
    onApply(text);
    close();
  };
  const submit = (event: FormEvent) => {
    event.preventDefault();
    const text = `${from}..${to || from}`;
    if (parseVersus(text)) apply(text);
    else setError(from && to && from > to ? 'The end lies before the beginning.' : 'Write months as 2024-01.');
  };
  const presets: { name: string; text: string | null }[] = [
    { name: 'The same period a year before', text: null },
    ...(now
      ? [
          { name: 'The same period two years before', text: earlier(now, 24) },
          { name: 'The months just before', text: earlier(now, monthCount(now)) },
        ]
      : []),
  ];
  return (
    <div className="flex flex-col gap-4">
      <ul className="flex flex-col">
        {presets.map(({ name, text }) => (
          <li key={name}>
            <button
              type="button"
              onClick={() => apply(text)}
              className="flex min-h-11 w-full items-center px-2 text-left hover:bg-act-weak pointer-fine:min-h-9"
            >
              {name}
            </button>
          </li>
        ))}
      </ul>
      <form onSubmit={submit} noValidate className="flex flex-col gap-3 border-t border-rule pt-3">
        <div className="grid grid-cols-2 gap-3">
          <Field label="From">
            <TextInput type="month" value={from} onChange={(event) => setFrom(event.target.value)} />
          </Field>
          <Field label="To, included" error={error}>
            <TextInput type="month" value={to} onChange={(event) => setTo(event.target.value)} />
          </Field>
        </div>
        <Button type="submit" tone="primary">
          Compare
        </Button>
      </form>
    </div>
  );
};
