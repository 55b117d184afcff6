'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Field, TextInput } from '@/components/ui/field';
import { addPerson } from './actions';
import { Outcome } from './outcome';
import { RoleFields, type Technicians } from './role-fields';
import { useFormAction } from './use-form-action';

const AddPersonForm = ({ technicians, close }: { technicians: Technicians; close: () => void }) => {
  const { state, submit, busy } = useFormAction(addPerson);
  // Typed text lives here, so that a refusal takes nothing away.
  const [name, setName] = useState('');
  const [email, setEmail] = useState('');
  if (state.done)
    return (
      <div className="flex flex-col gap-4">
        <Outcome state={state} />
        <p className="text-sm text-ink-2">The link works once and for seven days. It is not shown again.</p>
        <Button tone="primary" onClick={close}>
          Done
        </Button>
      </div>
    );
  return (
    <form onSubmit={submit} noValidate className="flex flex-col gap-4">
      <Field label="Name" error={state.fields.name} required>
        <TextInput name="name" autoComplete="off" value={name} onChange={(event) => setName(event.target.value)} />
      </Field>
      <Field label="E-mail" error={state.fields.email} required>
        <TextInput
          name="email"
          type="email"
          autoComplete="off"
          value={email}
          onChange={(event) => setEmail(event.target.value)}
        />
      </Field>
      <RoleFields technicians={technicians} fields={state.fields} />
      <Outcome state={state} />
      <Button type="submit" tone="primary" disabled={busy}>
        Add and make a link
      </Button>
    </form>
  );
};

/** Opens the form with which somebody is let in. */
export const AddPerson = ({ technicians }: { technicians: Technicians }) => {
  const [open, setOpen] = useState(false);
  return (
    <>
      <Button tone="primary" onClick={() => setOpen(true)}>
        Add a person
      </Button>
      <Dialog open={open} onOpenChange={setOpen} title="Add a person">
        <AddPersonForm technicians={technicians} close={() => setOpen(false)} />
      </Dialog>
    </>
  );
};
