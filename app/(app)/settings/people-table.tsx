'use client';

import { useState } from 'react';
import { TextButton } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Sheet } from '@/components/ui/sheet';
import { Table, Td, Th } from '@/components/ui/table';
import type { Member } from '@/lib/auth/members';
import { ROLE_NAMES } from '@/lib/wording';
import { PersonForm } from './person-form';
import type { Technicians } from './role-fields';

type PeopleTableProps = { members: readonly Member[]; technicians: Technicians; self: string };

/** Who can come in, and as what. */
export const PeopleTable = ({ members, technicians, self }: PeopleTableProps) => {
  const [chosenId, setChosenId] = useState<string | null>(null);
  const chosen = members.find((member) => member.personId === chosenId);
  return (
    <Sheet title="People">
      <Table label="People">
        <thead>
          <tr>
            <Th>Name</Th>
            <Th className="max-md:hidden">E-mail</Th>
            <Th>Role</Th>
            <Th className="max-md:hidden">Password</Th>
            <Th>
              <span className="sr-only">Change</span>
            </Th>
          </tr>
        </thead>
        <tbody>
          {members.map((member) => (
            <tr key={member.personId}>
              <Th scope="row" className="max-md:min-w-44">
                {member.name}
                {member.personId === self ? <span className="text-ink-2"> (you)</span> : null}
                <span className="block text-sm text-ink-2 wrap-anywhere md:hidden">{member.email}</span>
                {member.hasPassword ? null : <span className="marked text-sm md:hidden">no password yet</span>}
              </Th>
              <Td className="max-md:hidden">{member.email}</Td>
              <Td>
                {ROLE_NAMES[member.role]}
                {member.technician ? <span className="block text-sm text-ink-2">as {member.technician}</span> : null}
              </Td>
              <Td className="max-md:hidden">{member.hasPassword ? 'set' : <span className="marked">not yet</span>}</Td>
              <Td className="text-right">
                <TextButton onClick={() => setChosenId(member.personId)}>
                  Change<span className="sr-only"> {member.name}</span>
                </TextButton>
              </Td>
            </tr>
          ))}
        </tbody>
      </Table>
      <Dialog
        open={chosen !== undefined}
        onOpenChange={(open) => (open ? undefined : setChosenId(null))}
        title={chosen?.name ?? ''}
        description={chosen?.email}
      >
        {chosen ? <PersonForm member={chosen} technicians={technicians} isSelf={chosen.personId === self} /> : null}
      </Dialog>
    </Sheet>
  );
};
