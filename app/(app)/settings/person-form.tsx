'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import type { Member } from '@/lib/auth/members';
import { removePerson, renewPassword, setRole } from './actions';
import { Outcome } from './outcome';
import { RoleFields, type Technicians } from './role-fields';
import { useFormAction } from './use-form-action';

const Remove = ({ member }: { member: Member }) => {
  const [asked, setAsked] = useState(false);
  const { state, submit, busy } = useFormAction(removePerson);
  return (
    <form onSubmit={submit} className="flex flex-col gap-3">
      <input type="hidden" name="personId" value={member.personId} />
      {asked ? (
        <p>
          {member.name} will open nothing of this company any more. Records and history stay as they are. Remove{' '}
          {member.name}?
        </p>
      ) : null}
      <Outcome state={state} />
      <div className="flex flex-wrap gap-3">
        {asked ? (
          <>
            <Button key="yes" type="submit" tone="danger" disabled={busy}>
              Yes, remove
            </Button>
            <Button key="no" onClick={() => setAsked(false)}>
              Keep
            </Button>
          </>
        ) : (
          <Button key="ask" tone="danger" onClick={() => setAsked(true)}>
            Remove from the company
          </Button>
        )}
      </div>
    </form>
  );
};

type PersonFormProps = { member: Member; technicians: Technicians; isSelf: boolean };

/** What can be changed about one person: role, password link, belonging. */
export const PersonForm = ({ member, technicians, isSelf }: PersonFormProps) => {
  const change = useFormAction(setRole);
  const renew = useFormAction(renewPassword);
  return (
    <div className="flex flex-col gap-5">
      <form onSubmit={change.submit} className="flex flex-col gap-4">
        <input type="hidden" name="personId" value={member.personId} />
        <RoleFields
          technicians={technicians}
          role={member.role}
          technicianId={member.technicianId}
          fields={change.state.fields}
        />
        <Outcome state={change.state} />
        <Button type="submit" tone="primary" disabled={change.busy} className="self-start">
          Change the role
        </Button>
      </form>
      <form onSubmit={renew.submit} className="flex flex-col gap-3 border-t border-rule pt-4">
        <input type="hidden" name="personId" value={member.personId} />
        <Outcome state={renew.state} />
        <Button type="submit" disabled={renew.busy} className="self-start">
          Make a link for a new password
        </Button>
      </form>
      {isSelf ? null : (
        <div className="border-t border-rule pt-4">
          <Remove member={member} />
        </div>
      )}
    </div>
  );
};
