import { createReadStream, createWriteStream } from 'node:fs';
import { pipeline } from 'node:stream/promises';
import type pg from 'pg';
import { from as copyFrom, to as copyTo } from 'pg-copy-streams';
import { withConnection } from '@/db/cluster/roles';

const COLUMNS = `company_id, record_ref, recovered_on, recovered_at, technician_id, site_id, appliance_id, branch_id, category,
  job_type, refrigerant, nameplate_charge_kg, added_charge_kg, start_weight_kg, end_weight_kg, recovered_mass_kg, mass_unit,
  final_vacuum_kpa_abs, vacuum_unit, hold_minutes, cylinder_id, entered, extra, import_line, source_hash`;

const timedCopy = async (client: pg.Client, table: string, file: string): Promise<number> => {
  const began = performance.now();
  await pipeline(createReadStream(file), client.query(copyFrom(`copy ${table} (${COLUMNS}) from stdin`)));
  return (performance.now() - began) / 1000;
};

/**
 * Seconds that COPY takes for the records of a company as they stand, from a file: into the real table with its
 * constraints, history and kept months, and into a table that has only its columns and indexes. The rows go in under
 * new ticket numbers and go again. As administrator, because COPY takes no part in row-level security.
 */
export const copyBaseline = (adminUrl: string, companyId: string, file: string) =>
  withConnection(adminUrl, async (admin) => {
    await admin.query(`select set_config('app.company_id', $1, false)`, [companyId]);
    await pipeline(
      admin.query(
        copyTo(`copy (select ${COLUMNS.replace('record_ref', "'again ' || record_ref")} from recoveries
                      where company_id = '${companyId}' order by import_line) to stdout`),
      ),
      createWriteStream(file),
    );
    await admin.query(
      'create table bare_recoveries (like recoveries including generated including defaults including indexes)',
    );
    const bare = await timedCopy(admin, 'bare_recoveries', file);
    await admin.query('drop table bare_recoveries');
    const real = await timedCopy(admin, 'recoveries', file);
    return { real, bare };
  });
