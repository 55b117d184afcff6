import { createWriteStream } from 'node:fs';
import { pipeline } from 'node:stream/promises';
import { DuckDBInstance } from '@duckdb/node-api';
import { to as copyTo } from 'pg-copy-streams';
import { withConnection } from '@/db/cluster/roles';

/** The same aggregates as one SQL text each, over the rows of one company. */
export const RIVAL_QUERIES = {
  trends: `select month, refrigerant, sum(mass), count(*), median(yield), sum(mass * gwp) from r group by month, refrigerant
           union all select month, null, sum(mass), count(*), median(yield), sum(mass * gwp) from r group by month`,
  technicians: `select technician, count(*), sum(mass), sum(charge), sum(mass) / sum(charge), median(yield), min(day), max(day) from r group by technician`,
  sites: `select site, count(*), count(distinct appliance), sum(mass), sum(charge), sum(mass) / sum(charge), median(yield), max(day) from r group by site`,
} as const;

/** DuckDB in memory with two threads, holding one company's records; gives a function that times one query in ms. */
export const rivalEngine = async (adminUrl: string, companyId: string, file: string) => {
  await withConnection(adminUrl, async (admin) => {
    const rows = admin.query(
      copyTo(`copy (select r.recovered_month as month, r.recovered_on as day, r.refrigerant, t.name as technician, s.name as site,
                           r.appliance_id as appliance, r.recovered_mass_kg as mass, r.full_charge_kg as charge,
                           r.recovery_yield as yield, f.gwp_ar4 as gwp
                    from recoveries r join technicians t on t.id = r.technician_id join sites s on s.id = r.site_id
                    join refrigerants f on f.designation = r.refrigerant
                    where r.company_id = '${companyId}') to stdout (format csv, header)`),
    );
    await pipeline(rows, createWriteStream(file));
  });
  const instance = await DuckDBInstance.create(':memory:', { threads: '2' });
  const connection = await instance.connect();
  await connection.run(`create table r as select * from read_csv('${file}', header = true)`);
  return async (name: keyof typeof RIVAL_QUERIES): Promise<number> => {
    const began = performance.now();
    const result = await connection.runAndReadAll(RIVAL_QUERIES[name]);
    result.getRowObjectsJson();
    return performance.now() - began;
  };
};
