'use client';

import type { ReactNode } from 'react';
import type { KnownNames } from '@/analytics/records/known-names-contract';
import { MASS_FIELDS, type RecordField, type RecordTexts } from '@/lib/recoveries/fields';
import { VACUUM_UNITS } from '@/lib/vocabulary';
import { FieldInput } from './field-input';
import { FORM_PARTS } from './field-kinds';
import { RISE_UNIT_NAMES, VACUUM_UNIT_NAMES } from './wording';

type RecordFieldsProps = {
  texts: RecordTexts;
  onChange: (field: RecordField, value: string) => void;
  errors: Readonly<Record<string, string>>;
  names: KnownNames | undefined;
  /** A technician writes under his own name. */
  ownName?: string | undefined;
  /** Stands before a part of the form, by its title. */
  before?: Readonly<Record<string, ReactNode>>;
};

const suggestionsOf = (names: KnownNames | undefined): Partial<Record<RecordField, readonly string[]>> =>
  names
    ? {
        technician: names.technicians,
        branch: names.branches,
        site: names.sites,
        appliance: names.appliances.map(({ name }) => name),
        cylinder: names.cylinders,
        refrigerant: names.refrigerants,
      }
    : {};

const MASSES: readonly RecordField[] = MASS_FIELDS;

const unitOf = (field: RecordField, { massUnit, vacuumUnit }: RecordTexts): string | undefined => {
  if (MASSES.includes(field)) return massUnit;
  const unit = VACUUM_UNITS.find((known) => known === vacuumUnit);
  if (field === 'finalVacuum') return unit && VACUUM_UNIT_NAMES[unit];
  return field === 'holdRise' ? unit && RISE_UNIT_NAMES[unit] : undefined;
};

/** All fields of a record in the order of the work. */
export const RecordFields = ({ texts, onChange, errors, names, ownName, before = {} }: RecordFieldsProps) => {
  const suggestions = suggestionsOf(names);
  return (
    <>
      {FORM_PARTS.map(({ title, fields }) => (
        <div key={title}>
          {before[title]}
          <fieldset className="min-w-0 border-t-2 border-ink pt-3 pb-6">
            <legend className="float-left mb-3 w-full text-lg font-semibold">{title}</legend>
            <div className="clear-both grid gap-x-6 gap-y-4 sm:grid-cols-2">
              {fields.map((field) => (
                <FieldInput
                  key={field}
                  field={field}
                  value={field === 'technician' && ownName ? ownName : texts[field]}
                  onChange={(value) => onChange(field, value)}
                  error={errors[field]}
                  suggestions={suggestions[field]}
                  unit={unitOf(field, texts)}
                  readOnly={field === 'technician' && ownName !== undefined}
                />
              ))}
            </div>
          </fieldset>
        </div>
      ))}
    </>
  );
};
