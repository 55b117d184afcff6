import { and, eq } from 'drizzle-orm';
import { withCompany } from '@/db/client';
import { settings } from '@/db/schema/companies';

const KEY = 'demo';
const scope = (companyId: string) => ({ companyId, actor: 'demo' });

/** What the company's row of settings says: no demo, a demo that is being made, or a whole one. */
export const demoStateOf = (companyId: string): Promise<'none' | 'begun' | 'whole'> =>
  withCompany(scope(companyId), async (tx) => {
    const [row] = await tx
      .select({ value: settings.value })
      .from(settings)
      .where(and(eq(settings.companyId, companyId), eq(settings.key, KEY)));
    if (!row) return 'none';
    return row.value === 'whole' ? 'whole' : 'begun';
  });

/** Marks a company as one of the demo's: only such a company is ever removed. */
export const markDemo = (companyId: string, value: 'begun' | 'whole'): Promise<void> =>
  withCompany(scope(companyId), async (tx) => {
    await tx
      .insert(settings)
      .values({ companyId, key: KEY, value })
      .onConflictDoUpdate({ target: [settings.companyId, settings.key], set: { value } });
  });

/** Whether the company is one of the demo's. */
export const isDemo = async (companyId: string): Promise<boolean> => (await demoStateOf(companyId)) !== 'none';
