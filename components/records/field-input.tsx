'use client';

import { useId } from 'react';
import { Term } from '@/components/glossary/term';
import { Field, Select, TextArea, TextInput } from '@/components/ui/field';
import { FIELD_LABELS, type RecordField } from '@/lib/recoveries/fields';
import { ALWAYS_CHOSEN, CHOICES, FIELD_TERMS, HINTS, NEEDED, NUMBERS } from './field-kinds';
import { WhenInput } from './when-input';

type FieldInputProps = {
  field: RecordField;
  value: string;
  onChange: (value: string) => void;
  error?: string | undefined;
  /** Names that are known; typing another is allowed. */
  suggestions?: readonly string[] | undefined;
  readOnly?: boolean;
  /** The unit the figure is in, said beside its name. */
  unit?: string | undefined;
};

const TALL = 'h-12';

const Control = ({
  field,
  value,
  onChange,
  suggestions,
  readOnly = false,
}: Omit<FieldInputProps, 'error' | 'unit'>) => {
  const listId = useId();
  const choices = CHOICES[field];
  if (field === 'recoveredAt') return <WhenInput value={value} onChange={onChange} className={TALL} />;
  if (choices)
    return (
      <Select value={value} onChange={(event) => onChange(event.target.value)} className={TALL}>
        {ALWAYS_CHOSEN.has(field) ? null : <option value="">not stated</option>}
        {choices.map((choice) => (
          <option key={choice.value} value={choice.value}>
            {choice.label}
          </option>
        ))}
      </Select>
    );
  if (field === 'notes')
    return <TextArea value={value} onChange={(event) => onChange(event.target.value)} maxLength={10_000} />;
  return (
    <>
      <TextInput
        value={value}
        onChange={(event) => onChange(event.target.value)}
        readOnly={readOnly}
        autoComplete="off"
        maxLength={200}
        {...(field === 'manufacturedOn' ? { type: 'date' } : {})}
        {...(NUMBERS.has(field)
          ? { inputMode: 'decimal' as const, className: `${TALL} font-mono text-lg` }
          : { className: TALL })}
        {...(suggestions ? { list: listId } : {})}
      />
      {suggestions ? (
        <datalist id={listId}>
          {suggestions.map((name) => (
            <option key={name} value={name} />
          ))}
        </datalist>
      ) : null}
    </>
  );
};

/** One field of a record with its label, hint and what is wrong with it. */
export const FieldInput = ({ error, unit, ...rest }: FieldInputProps) => {
  const term = FIELD_TERMS[rest.field];
  return (
    <Field
      label={unit ? `${FIELD_LABELS[rest.field]}, ${unit}` : FIELD_LABELS[rest.field]}
      hint={HINTS[rest.field]}
      aside={term ? <Term id={term} /> : undefined}
      error={error}
      required={NEEDED.has(rest.field)}
      className={rest.field === 'notes' ? 'sm:col-span-2' : 'sm:justify-end'}
    >
      <Control {...rest} />
    </Field>
  );
};
