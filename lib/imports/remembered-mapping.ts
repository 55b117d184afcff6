import 'server-only';
import { and, eq } from 'drizzle-orm';
import type { PoolClient } from 'pg';
import { type CompanyScope, withCompanyJob } from '@/db/client';
import { importMappings } from '@/db/schema/imports';
import { type Mapping, mappingSchema } from './contract';
import { keptFile } from './file-chunks';
import type { ImportWork } from './import-work';
import { headerKeyOfFile, profileFile } from './read-file';
import type { FilePlan } from './rows';

const remembered = ({ companyId, actor }: CompanyScope, headerKey: string): Promise<Mapping | null> =>
  withCompanyJob({ companyId, actor }, async (tx) => {
    const [found] = await tx
      .select({ mapping: importMappings.mapping })
      .from(importMappings)
      .where(and(eq(importMappings.companyId, companyId), eq(importMappings.headerKey, headerKey)));
    return found ? mappingSchema.parse(found.mapping) : null;
  });

/** How the file is read: by what the person told now, told last time for such headers, and the evidence in the file. */
export const planFile = async ({ scope, importId, told, context }: ImportWork): Promise<FilePlan> => {
  const open = keptFile(scope, importId);
  const before = await remembered(scope, await headerKeyOfFile(open, told, context));
  return profileFile(open, told, before, context);
};

/** What was told now goes before what was told last time, column by column. */
export const mergeMappings = (before: Mapping, now: Mapping): Mapping => ({
  ...before,
  ...now,
  ...(before.columns || now.columns ? { columns: { ...before.columns, ...now.columns } } : {}),
  ...(before.dateOrders || now.dateOrders ? { dateOrders: { ...before.dateOrders, ...now.dateOrders } } : {}),
  ...(before.decimalMarks || now.decimalMarks ? { decimalMarks: { ...before.decimalMarks, ...now.decimalMarks } } : {}),
});

/** Keeps what the person told, for the next file with the same headers. Whether corrections yield is told anew each time. */
export const rememberMapping = async (client: PoolClient, work: ImportWork, plan: FilePlan): Promise<void> => {
  const { overwriteCorrections: _, ...told } = work.told;
  if (!Object.keys(told).length) return;
  const { companyId } = work.scope;
  const merged = mergeMappings((await remembered(work.scope, plan.headerKey)) ?? {}, told);
  await client.query(
    `insert into import_mappings (company_id, header_key, mapping) values ($1, $2, $3)
     on conflict (company_id, header_key) do update set mapping = excluded.mapping, updated_at = now()`,
    [companyId, plan.headerKey, JSON.stringify(merged)],
  );
};
