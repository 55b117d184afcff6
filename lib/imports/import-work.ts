import 'server-only';
import { eq, sql } from 'drizzle-orm';
import { type CompanyScope, withCompanyJob } from '@/db/client';
import { companies } from '@/db/schema/companies';
import { imports } from '@/db/schema/imports';
import { refrigerants } from '@/db/schema/refrigerants';
import type { ImportPayload } from '@/lib/jobs/task';
import { type Mapping, mappingSchema } from './contract';
import type { ReadContext } from './rows';

/** Everything that the work on one import must know before it begins. */
export type ImportWork = {
  importId: string;
  scope: CompanyScope;
  dryRun: boolean;
  told: Mapping;
  context: ReadContext;
};

/** Loads it; null when the import is gone or over. */
export const loadImportWork = ({ companyId, importId, actor }: ImportPayload): Promise<ImportWork | null> =>
  withCompanyJob({ companyId, actor }, async (tx) => {
    const [found] = await tx
      .select({
        record: imports,
        timeZone: companies.timeZone,
        today: sql<string>`(now() at time zone ${companies.timeZone})::date::text`,
      })
      .from(imports)
      .innerJoin(companies, eq(companies.id, imports.companyId))
      .where(eq(imports.id, importId));
    if (!found || !['queued', 'running'].includes(found.record.status)) return null;
    const { fileName, dryRun, mapping } = found.record;
    const catalogue = await tx.select({ designation: refrigerants.designation }).from(refrigerants);
    return {
      importId,
      scope: { companyId, actor, reason: `import of ${fileName}` },
      dryRun,
      told: mappingSchema.parse(mapping),
      context: {
        fileName,
        timeZone: found.timeZone,
        today: found.today,
        refrigerants: new Set(catalogue.map(({ designation }) => designation)),
      },
    };
  });
