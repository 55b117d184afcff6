'use client';

import { useState } from 'react';
import { monthOf, monthsBefore, type ScopeSelection } from '@/analytics/scope-address';
import { useViewer } from '@/components/viewer-context';
import { PeriodForm } from './period-form';
import { isPeriodPart } from './wording';

type Period = { from: string | null; to: string | null };
type PeriodEditorProps = {
  scope: ScopeSelection;
  firstMonth: string | null;
  onApply: (period: Period) => void;
  close: () => void;
};

const presets = (running: string, firstMonth: string | null): { name: string; period: Period }[] => [
  { name: 'The last 12 whole months', period: { from: monthsBefore(running, 12), to: monthsBefore(running, 1) } },
  { name: 'The last 24 whole months and this one', period: { from: null, to: null } },
  { name: 'This year', period: { from: `${running.slice(0, 4)}-01`, to: null } },
  {
    name: 'Last year',
    period: { from: `${Number(running.slice(0, 4)) - 1}-01`, to: `${Number(running.slice(0, 4)) - 1}-12` },
  },
  ...(firstMonth ? [{ name: 'Everything', period: { from: firstMonth, to: null } }] : []),
];

const fault = (from: string, to: string): string | null => {
  for (const part of [from, to])
    if (part && !isPeriodPart(part)) return 'Write a month as 2026-11, or a day as 2026-11-30.';
  return from && to && from.slice(0, 7) > to.slice(0, 7) ? 'The end lies before the beginning.' : null;
};

/** From and to, both included; or one of the periods that are asked for most. */
export const PeriodEditor = ({ scope, firstMonth, onApply, close }: PeriodEditorProps) => {
  const { timeZone } = useViewer();
  const running = monthOf(new Date(), timeZone);
  const [from, setFrom] = useState(scope.from ?? '');
  const [to, setTo] = useState(scope.to ?? '');
  const [error, setError] = useState<string | null>(null);
  const apply = (period: Period) => {
    onApply(period);
    close();
  };
  const submit = () => {
    const found = fault(from, to);
    setError(found);
    if (!found) apply({ from: from || null, to: to || null });
  };
  // A day in the address is kept as a day; months are picked as months.
  const typeOf = (part: string) => (part.length > 7 ? 'date' : 'month');
  return (
    <PeriodForm
      presets={presets(running, firstMonth).map(({ name, period }) => ({ name, choose: () => apply(period) }))}
      from={{ value: from, type: typeOf(scope.from ?? ''), onChange: setFrom }}
      to={{ value: to, type: typeOf(scope.to ?? ''), onChange: setTo }}
      error={error}
      onSubmit={submit}
      submitName="Show"
    >
      <p className="text-sm text-ink-2">Leave “To” empty to see up to today.</p>
    </PeriodForm>
  );
};
