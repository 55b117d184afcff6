'use client';

import { type FormEvent, useState } from 'react';
import { Button } from '@/components/ui/button';
import { Field, TextInput } from '@/components/ui/field';

/** Looks for a text in ref, technician, site and appliance; Enter or the button begins. */
export const SearchBox = ({ value, onSearch }: { value: string; onSearch: (text: string) => void }) => {
  const [typed, setTyped] = useState(value);
  const [shown, setShown] = useState(value);
  // The address changed by itself (Back, Clear): the box follows it.
  if (shown !== value) {
    setShown(value);
    setTyped(value);
  }
  const submit = (event: FormEvent) => {
    event.preventDefault();
    onSearch(typed.trim());
  };
  return (
    <search className="w-full sm:w-auto">
      <form onSubmit={submit} className="flex gap-2">
        <Field label="Find a record" labelHidden className="grow sm:w-72">
          <TextInput
            type="search"
            value={typed}
            maxLength={200}
            onChange={(event) => setTyped(event.target.value)}
            placeholder="Ref, technician, site or appliance"
          />
        </Field>
        <Button type="submit">Find</Button>
      </form>
    </search>
  );
};
