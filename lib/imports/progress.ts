import 'server-only';
import { and, eq, inArray, sql } from 'drizzle-orm';
import type { PgUpdateSetSource } from 'drizzle-orm/pg-core';
import { type CompanyScope, withCompanyJob } from '@/db/client';
import { imports } from '@/db/schema/imports';
import type { ImportPayload } from '@/lib/jobs/task';
import type { FilePlan } from './rows';

const set = (scope: CompanyScope, importId: string, values: PgUpdateSetSource<typeof imports>) =>
  withCompanyJob(scope, (tx) =>
    tx
      .update(imports)
      .set(values)
      .where(
        and(
          eq(imports.companyId, scope.companyId),
          eq(imports.id, importId),
          inArray(imports.status, ['queued', 'running']),
        ),
      ),
  );

/** Tells that the work has begun. These updates stand outside of the import's own transaction, so that they are seen. */
export const markRunning = async (scope: CompanyScope, importId: string): Promise<void> => {
  await set(scope, importId, { status: 'running', startedAt: sql`now()`, rowsRead: 0 });
};

/** Tells how the file is read and how long it is. */
export const markPlanned = async (scope: CompanyScope, importId: string, plan: FilePlan): Promise<void> => {
  const { reading, headerKey, rowsTotal } = plan;
  await set(scope, importId, { reading, headerKey, rowsTotal });
};

/** Tells how far the reading has come. */
export const markRead = async (scope: CompanyScope, importId: string, rowsRead: number): Promise<void> => {
  await set(scope, importId, { rowsRead });
};

/** A preview that could not decide: what is open stands in the reading, no row was looked at. */
export const markAsked = async (scope: CompanyScope, importId: string): Promise<void> => {
  await set(scope, importId, { status: 'done', rowsRead: 0, finishedAt: sql`now()` });
};

/** Ends an import that took nothing in, with a sentence for the person. */
export const failImport = async ({ companyId, importId }: ImportPayload, sentence: string): Promise<void> => {
  const nothing = { rowsRead: 0, added: 0, updated: 0, unchanged: 0, rejected: 0, summary: null };
  await set({ companyId, actor: 'import' }, importId, {
    ...{ status: 'failed', failure: sentence, finishedAt: sql`now()` },
    ...nothing,
  });
};
