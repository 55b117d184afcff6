'use client';

import { useState } from 'react';
import { monthsBefore } from '@/analytics/scope-address';
import { parseVersus, versusText } from '@/analytics/trends-comparison/versus';
import { PeriodForm } from '@/components/scope/period-form';

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
  const submit = () => {
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
    <PeriodForm
      presets={presets.map(({ name, text }) => ({ name, choose: () => apply(text) }))}
      from={{ value: from, onChange: setFrom }}
      to={{ value: to, onChange: setTo }}
      error={error}
      onSubmit={submit}
      submitName="Compare"
    />
  );
};
