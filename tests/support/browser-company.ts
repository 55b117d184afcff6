import { hashPassword } from '@/lib/auth/passwords';
import { addMember, createCompany } from '@/lib/auth/provision';

/** A company without a record yet, whose operations manager brings the first file in. */
export const addEmptyCompany = async (): Promise<{ role: string; email: string; password: string }> => {
  const signIn = { role: 'newcomer', email: 'newcomer@example.test', password: 'a password for tests' };
  const companyId = await createCompany('Fennwick Refrigeration');
  await addMember(companyId, {
    email: signIn.email,
    name: 'Ines Fennwick',
    role: 'operations',
    passwordHash: await hashPassword(signIn.password),
  });
  return signIn;
};
