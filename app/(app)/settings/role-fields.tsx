'use client';

import { useState } from 'react';
import { Field, Select } from '@/components/ui/field';
import { ROLES, type Role } from '@/lib/vocabulary';
import { ROLE_NAMES, ROLE_PURPOSES } from '@/lib/wording';

export type Technicians = readonly { id: string; name: string }[];

type RoleFieldsProps = {
  technicians: Technicians;
  role?: Role;
  technicianId?: string | null;
  fields: Record<string, string>;
};

/** The role, and for a technician which one of the records he is. */
export const RoleFields = ({ technicians, role: before = 'operations', technicianId, fields }: RoleFieldsProps) => {
  const [role, setRole] = useState<Role>(before);
  const [technician, setTechnician] = useState(technicianId ?? '');
  return (
    <>
      <Field label="Role" hint={ROLE_PURPOSES[role]} error={fields.role}>
        <Select
          name="role"
          value={role}
          onChange={(event) => setRole(ROLES.find((one) => one === event.target.value) ?? before)}
        >
          {ROLES.map((one) => (
            <option key={one} value={one}>
              {ROLE_NAMES[one]}
            </option>
          ))}
        </Select>
      </Field>
      {role === 'technician' ? (
        <Field
          label="Which technician of the records"
          hint="Only this technician’s records will be shown."
          error={fields.technicianId}
        >
          <Select name="technicianId" value={technician} onChange={(event) => setTechnician(event.target.value)}>
            <option value="">Choose</option>
            {technicians.map(({ id, name }) => (
              <option key={id} value={id}>
                {name}
              </option>
            ))}
          </Select>
        </Field>
      ) : null}
    </>
  );
};
