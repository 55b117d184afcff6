'use client';

import { useId } from 'react';
import { Select } from '@/components/ui/field';
import { formatCount } from '@/lib/format';
import type { ColumnReading, Mapping, Reading } from '@/lib/imports/contract';
import { isDateField, isNumberField } from '@/lib/imports/field-kinds';
import { FIELD_NAMES } from '@/lib/imports/field-names';
import { RECOVERY_FIELDS } from '@/lib/imports/fields';
import { tellDateOrder, tellDecimalMark, tellField } from './tell';

const FROM: Record<ColumnReading['fieldFrom'], string> = {
  told: 'as you said',
  remembered: 'as you said for the last file with these columns',
  name: 'by its name',
  none: 'kept with the record as it is',
};

const fieldOf = (value: string) => RECOVERY_FIELDS.find((field) => field === value) ?? null;

/** The field the person has given the column in this draft, or the one it was read with. */
const drafted = (mapping: Mapping, { header, field }: ColumnReading) => {
  const told = RECOVERY_FIELDS.find((name) => mapping.columns?.[name] === header);
  if (told) return told;
  return field && mapping.columns?.[field] === null ? null : field;
};

type ColumnRowProps = {
  column: ColumnReading;
  reading: Reading;
  mapping: Mapping;
  onTell: (mapping: Mapping) => void;
};

/** One column of the file: what it is called, what it holds, how it is read and why; each changeable in place. */
export const ColumnRow = ({ column, reading, mapping, onTell }: ColumnRowProps) => {
  const id = useId();
  const { header, dateOrder, decimalMark, unit, filled, examples } = column;
  const field = drafted(mapping, column);
  const why = [dateOrder?.evidence, decimalMark?.evidence, unit ? `Unit: ${unit.value}. ${unit.evidence}` : undefined];
  return (
    <li className="grid gap-x-6 gap-y-2 border-b border-rule-2 py-3 last:border-b-0 md:grid-cols-[minmax(0,1fr)_minmax(0,1fr)_minmax(0,1.4fr)]">
      <div className="min-w-0">
        <p id={`${id}-name`} className="font-semibold break-words">
          {header}
        </p>
        <p className="text-sm break-words text-ink-2">
          {filled ? examples.join(' · ') : 'empty'}
          {filled ? <span className="whitespace-nowrap"> ({formatCount(filled)} filled)</span> : null}
        </p>
      </div>
      <div className="min-w-0">
        <Select
          aria-labelledby={`${id}-name`}
          aria-describedby={`${id}-from`}
          value={field ?? ''}
          onChange={(event) => onTell(tellField(mapping, reading, header, fieldOf(event.target.value)))}
        >
          <option value="">no field of ours</option>
          {RECOVERY_FIELDS.map((name) => (
            <option key={name} value={name}>
              {FIELD_NAMES[name]}
            </option>
          ))}
        </Select>
        <p id={`${id}-from`} className="mt-1 text-sm text-ink-2">
          {field === column.field ? FROM[column.fieldFrom] : 'changed; read the file again to see it'}
        </p>
      </div>
      <div className="flex min-w-0 flex-col gap-2">
        {isDateField(field) ? (
          <Select
            aria-label={`Order of the dates in ${header}`}
            value={mapping.dateOrders?.[header] ?? dateOrder?.value ?? ''}
            onChange={(event) => onTell(tellDateOrder(mapping, header, event.target.value))}
          >
            {dateOrder ? null : <option value="">order not decided yet</option>}
            <option value="ymd">year, month, day</option>
            <option value="dmy">day, month, year</option>
            <option value="mdy">month, day, year</option>
          </Select>
        ) : null}
        {isNumberField(field) && filled ? (
          <Select
            aria-label={`Decimal mark in ${header}`}
            value={mapping.decimalMarks?.[header] ?? decimalMark?.value ?? ''}
            onChange={(event) => onTell(tellDecimalMark(mapping, header, event.target.value))}
          >
            {decimalMark ? null : <option value="">decimal mark not decided yet</option>}
            <option value="point">decimal point: 1.5</option>
            <option value="comma">decimal comma: 1,5</option>
          </Select>
        ) : null}
        {why.map((sentence) =>
          sentence ? (
            <p key={sentence} className="text-sm break-words text-ink-2">
              {sentence}
            </p>
          ) : null,
        )}
      </div>
    </li>
  );
};
