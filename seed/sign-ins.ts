import { eq } from 'drizzle-orm';
import { withCompany } from '@/db/client';
import { technicians } from '@/db/schema/places';
import { hashPassword } from '@/lib/auth/passwords';
import { addMember } from '@/lib/auth/provision';
import type { Role } from '@/lib/vocabulary';
import type { DemoCompany } from './company';

/** Public on purpose, and good for the demo only: `npm start` prints it and the README names it. */
const DEMO_PASSWORD = 'grey body, yellow shoulder';

type Person = { email: string; name: string; role: Role };

const CREW: readonly Person[] = [
  { role: 'owner', email: 'owner@brackenmoor.example', name: 'Marisol Thackeray' },
  { role: 'operations', email: 'operations@brackenmoor.example', name: 'Desmond Achterberg' },
  { role: 'trainer', email: 'trainer@brackenmoor.example', name: 'Priya Halloran' },
  { role: 'technician', email: 'technician@brackenmoor.example', name: 'named after a technician of the crew' },
  { role: 'office', email: 'office@brackenmoor.example', name: 'Wen Castleford' },
  { role: 'auditor', email: 'auditor@brackenmoor.example', name: 'Solveig Okafor' },
];
const IN_BOTH: Person = { role: 'operations', email: 'both@brackenmoor.example', name: 'Tobias Renard-Ito' };

/** Who can sign in to the demo, and how. */
export const DEMO_SIGN_INS: { role: string; email: string; password: string }[] = [
  ...CREW.map(({ role, email }) => ({ role, email, password: DEMO_PASSWORD })),
  { role: 'two firms', email: IN_BOTH.email, password: DEMO_PASSWORD },
];

/** Makes the people of the two demo companies; the technician is an ordinary one who is still there. */
export const addSignIns = async (companyId: string, company: DemoCompany, smallCompanyId: string): Promise<void> => {
  const ordinary = company.technicians.find(({ habit, untilMonth }) => habit === 'ordinary' && untilMonth === null);
  const [technician] = await withCompany({ companyId, actor: 'demo' }, (tx) =>
    tx
      .select({ id: technicians.id, name: technicians.name })
      .from(technicians)
      .where(eq(technicians.name, ordinary?.name ?? '')),
  );
  for (const person of CREW) {
    const passwordHash = await hashPassword(DEMO_PASSWORD);
    const own =
      person.role === 'technician' && technician ? { name: technician.name, technicianId: technician.id } : {};
    await addMember(companyId, { ...person, ...own, passwordHash });
  }
  const passwordHash = await hashPassword(DEMO_PASSWORD);
  await addMember(companyId, { ...IN_BOTH, passwordHash });
  await addMember(smallCompanyId, { ...IN_BOTH, role: 'owner' });
};
