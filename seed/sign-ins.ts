import { eq } from 'drizzle-orm';
import { withCompany } from '@/db/client';
import { technicians } from '@/db/schema/places';
import { hashPassword } from '@/lib/auth/passwords';
import { addMember } from '@/lib/auth/provision';
import type { Role } from '@/lib/vocabulary';
import type { DemoCompany } from './company';

/** Public on purpose, and good for the demo only: `npm start` prints it and anybody can read it here. */
const DEMO_PASSWORD = 'grey body, yellow shoulder';

type Person = { email: string; name: string; role: Role };

const CREW: readonly Person[] = [
  { role: 'owner', email: 'owner@brackenmoor.example', name: 'Marisol Thackeray' },
  { role: 'operations', email: 'operations@brackenmoor.example', name: 'Desmond Achterberg' },
  { role: 'trainer', email: 'trainer@brackenmoor.example', name: 'Priya Halloran' },
  { role: 'technician', email: 'technician@brackenmoor.example', name: 'as in the crew' },
  { role: 'office', email: 'office@brackenmoor.example', name: 'Wen Castleford' },
  { role: 'auditor', email: 'auditor@brackenmoor.example', name: 'Solveig Okafor' },
];
const IN_BOTH: Person = { role: 'operations', email: 'both@brackenmoor.example', name: 'Tobias Renard-Ito' };

/** Who can sign in to the demo, and how. */
export const DEMO_SIGN_INS: { role: string; email: string; password: string }[] = [
  ...CREW.map(({ role, email }) => ({ role, email, password: DEMO_PASSWORD })),
  { role: 'two firms', email: IN_BOTH.email, password: DEMO_PASSWORD },
];

const add = async (companyId: string, person: Person & { technicianId?: string }): Promise<string> =>
  addMember(companyId, { ...person, passwordHash: await hashPassword(DEMO_PASSWORD) });

/** An ordinary technician of the crew who is still there. */
const technicianOf = async (companyId: string, { technicians: crew }: DemoCompany) => {
  const ordinary = crew.find(({ habit, untilMonth }) => habit === 'ordinary' && untilMonth === null);
  const [row] = await withCompany({ companyId, actor: 'demo' }, (tx) =>
    tx
      .select({ technicianId: technicians.id, name: technicians.name })
      .from(technicians)
      .where(eq(technicians.name, ordinary?.name ?? '')),
  );
  return row ?? {};
};

/** Makes the people of the large demo company, one for each role; gives the id of who hands files in. */
export const addCrewSignIns = async (companyId: string, company: DemoCompany): Promise<string> => {
  const own = await technicianOf(companyId, company);
  let office = '';
  for (const person of CREW) {
    const id = await add(companyId, person.role === 'technician' ? { ...person, ...own } : person);
    if (person.role === 'office') office = id;
  }
  await add(companyId, IN_BOTH);
  return office;
};

/** Makes the person of both companies the owner of the small one; gives the id. */
export const addSmallOwner = (companyId: string): Promise<string> => add(companyId, { ...IN_BOTH, role: 'owner' });
