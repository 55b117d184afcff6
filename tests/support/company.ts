import { randomUUID } from 'node:crypto';
import { createAccessToken, createCompany } from '@/lib/auth/provision';
import type { Role } from '@/lib/vocabulary';

/** A fresh empty company and a maker of bearer tokens for it. */
export const newCompany = async (name = `Test company ${randomUUID()}`, timeZone = 'America/New_York') => {
  const companyId = await createCompany(name, { timeZone });
  const token = (role: Role, technicianId?: string) =>
    createAccessToken(companyId, { role, label: `test ${role}`, ...(technicianId ? { technicianId } : {}) });
  return { companyId, name, token, scope: { companyId, actor: 'test' } };
};

/** A request as a program with a token would send it. */
export const apiRequest = (path: string, token?: string, init: RequestInit = {}): Request =>
  new Request(`http://127.0.0.1:3000${path}`, {
    ...init,
    headers: { ...(token ? { authorization: `Bearer ${token}` } : {}), ...init.headers },
  });
