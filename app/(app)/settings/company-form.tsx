'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Field, Select, TextInput } from '@/components/ui/field';
import { Sheet } from '@/components/ui/sheet';
import { DISPLAY_UNITS, type DisplayUnit } from '@/lib/vocabulary';
import { UNIT_NAMES } from '@/lib/wording';
import { saveCompany } from './actions';
import { Outcome } from './outcome';
import { useFormAction } from './use-form-action';

type CompanyFormProps = { name: string; timeZone: string; massUnit: DisplayUnit; zones: readonly string[] };

/** Name, zone and unit of the company. */
export const CompanyForm = ({ name: before, timeZone, massUnit, zones }: CompanyFormProps) => {
  const { state, submit, busy } = useFormAction(saveCompany);
  const [name, setName] = useState(before);
  const [zone, setZone] = useState(timeZone);
  const [unit, setUnit] = useState<DisplayUnit>(massUnit);
  return (
    <Sheet title="Company">
      <form onSubmit={submit} noValidate className="flex flex-col gap-4 pb-2">
        <Field label="Name" error={state.fields.name} required>
          <TextInput name="name" value={name} onChange={(event) => setName(event.target.value)} />
        </Field>
        <Field
          label="Time zone"
          hint="Days and months of new records are reckoned in it; dates already written stay."
          error={state.fields.timeZone}
        >
          <Select name="timeZone" value={zone} onChange={(event) => setZone(event.target.value)}>
            {(zones.includes(timeZone) ? zones : [timeZone, ...zones]).map((one) => (
              <option key={one} value={one}>
                {one}
              </option>
            ))}
          </Select>
        </Field>
        <Field label="Unit of mass" hint="For reading. Records keep the unit they were written in.">
          <Select
            name="massUnit"
            value={unit}
            onChange={(event) => setUnit(DISPLAY_UNITS.find((one) => one === event.target.value) ?? massUnit)}
          >
            {DISPLAY_UNITS.map((one) => (
              <option key={one} value={one}>
                {UNIT_NAMES[one]}
              </option>
            ))}
          </Select>
        </Field>
        <Outcome state={state} />
        <Button type="submit" tone="primary" disabled={busy} className="self-start">
          Save
        </Button>
      </form>
    </Sheet>
  );
};
