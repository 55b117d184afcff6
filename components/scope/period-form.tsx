'use client';

import type { FormEvent, ReactNode } from 'react';
import { Button } from '@/components/ui/button';
import { Field, TextInput } from '@/components/ui/field';

/** One end of a period as it is being written. */
type PeriodEnd = { value: string; type?: 'month' | 'date'; onChange: (value: string) => void };

type PeriodFormProps = {
  /** Periods that are asked for most, each chosen by its name. */
  presets: readonly { name: string; choose: () => void }[];
  from: PeriodEnd;
  to: PeriodEnd;
  error: string | null;
  onSubmit: () => void;
  submitName: string;
  children?: ReactNode;
};

/** Sets a period: one of those that are asked for most, or from and to, both included. */
export const PeriodForm = ({ presets, from, to, error, onSubmit, submitName, children }: PeriodFormProps) => {
  const submit = (event: FormEvent) => {
    event.preventDefault();
    onSubmit();
  };
  const input = ({ value, type = 'month', onChange }: PeriodEnd) => (
    <TextInput type={type} value={value} onChange={(event) => onChange(event.target.value)} />
  );
  return (
    <div className="flex flex-col gap-4">
      <ul className="flex flex-col">
        {presets.map(({ name, choose }) => (
          <li key={name}>
            <button
              type="button"
              onClick={choose}
              className="flex min-h-11 w-full items-center px-2 text-left hover:bg-act-weak pointer-fine:min-h-9"
            >
              {name}
            </button>
          </li>
        ))}
      </ul>
      <form onSubmit={submit} noValidate className="flex flex-col gap-3 border-t border-rule pt-3">
        <div className="grid grid-cols-2 gap-3">
          <Field label="From">{input(from)}</Field>
          <Field label="To, included" error={error}>
            {input(to)}
          </Field>
        </div>
        {children}
        <Button type="submit" tone="primary">
          {submitName}
        </Button>
      </form>
    </div>
  );
};
