import 'server-only';
import type { PoolClient } from 'pg';
import type { ImportSummary } from './contract';
import { RECORD_NAMES, type Stated } from './record-columns';
import { changedFields, newNames, REJECTED_BY_REASON } from './sql/summary';

/** What the decided rows come to, for the person. To be asked before the records are written. */
export const summarize = async (
  client: PoolClient,
  companyId: string,
  timeZone: string,
  stated: Stated,
): Promise<ImportSummary> => {
  const rejected = await client.query<ImportSummary['rejectedByReason'][number]>(REJECTED_BY_REASON);
  const changes = await client.query<ImportSummary['changes'][number]>(changedFields(stated), [companyId, timeZone]);
  const nothing = () => ({ count: 0, examples: [] as string[] });
  const names: ImportSummary['newNames'] = {
    ...{ branches: nothing(), technicians: nothing(), sites: nothing(), appliances: nothing(), cylinders: nothing() },
  };
  for (const name of RECORD_NAMES) {
    const { rows } = await client.query<{ count: number; examples: string[] }>(newNames(name));
    names[name.table] = rows[0] ?? nothing();
  }
  return { rejectedByReason: rejected.rows, newNames: names, changes: changes.rows, keptByUndo: [] };
};
