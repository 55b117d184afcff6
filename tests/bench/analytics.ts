import { writeFileSync } from 'node:fs';
import { arch, cpus, totalmem } from 'node:os';
import { join } from 'node:path';
import autocannon from 'autocannon';
import { withConnection } from '@/db/cluster/roles';
import { createAccessToken, createCompany } from '@/lib/auth/provision';
import type { Bench } from '@/lib/launch/bench';
import { fillCompany } from './many-records';
import { type RIVAL_QUERIES, rivalEngine } from './rival-engine';

const SIZES = [10_000, 100_000, 1_000_000];
const PAIRS = 5;
const ROUTES = {
  trends: '/api/trends/monthly?by=refrigerant',
  technicians: '/api/technicians',
  sites: '/api/sites',
} as const satisfies Record<keyof typeof RIVAL_QUERIES, string>;
const PAGES = {
  ...ROUTES,
  records: '/api/recoveries?limit=50',
  'one month': '/api/recoveries?from=2025-06&to=2025-06&limit=50',
};

const median = (values: number[]): number =>
  values.toSorted((a, b) => a - b)[Math.floor(values.length / 2)] ?? Number.NaN;
const ms = (value: number): string => (value < 10 ? value.toFixed(1) : value.toFixed(0));

/** One record is touched, so that nothing that was kept can be the answer. */
const touch = (adminUrl: string, companyId: string): Promise<void> =>
  withConnection(adminUrl, async (admin) => {
    await admin.query(`select set_config('app.company_id', $1, false), set_config('app.actor', 'bench', false)`, [
      companyId,
    ]);
    await admin.query(
      `update recoveries set notes = clock_timestamp()::text where company_id = $1 and record_ref = 'B-77'`,
      [companyId],
    );
  });

const timed = async (url: string, token: string): Promise<number> => {
  const began = performance.now();
  const response = await fetch(url, { headers: { authorization: `Bearer ${token}` } });
  await response.text();
  if (response.status !== 200) throw new Error(`${response.status} from ${url}`);
  return performance.now() - began;
};

type Measured = {
  rows: number;
  route: string;
  firstMs: number;
  repeatedMs: number;
  rivalMs: number | null;
  p95Ms20Readers: number | null;
};

const measure = async ({ database, served }: Bench, rows: number): Promise<Measured[]> => {
  const companyId = await createCompany(`bench ${rows} records`);
  const token = await createAccessToken(companyId, { role: 'owner', label: 'bench' });
  await fillCompany(database.urls.admin, companyId, rows);
  const rival = await rivalEngine(database.urls.admin, companyId, join('.local', `bench-${rows}.csv`));
  const results: Measured[] = [];
  for (const [route, path] of Object.entries(PAGES)) {
    const url = `${served.address}${path}`;
    const first: number[] = [];
    const repeated: number[] = [];
    const theirs: number[] = [];
    for (let pair = 0; pair < PAIRS; pair++) {
      await touch(database.urls.admin, companyId);
      first.push(await timed(url, token));
      repeated.push(await timed(url, token));
      if (route in ROUTES) theirs.push(await rival(route as keyof typeof ROUTES));
    }
    const load = await autocannon({ url, connections: 20, duration: 5, headers: { authorization: `Bearer ${token}` } });
    results.push({
      rows,
      route,
      firstMs: median(first),
      repeatedMs: median(repeated),
      rivalMs: theirs.length ? median(theirs) : null,
      p95Ms20Readers: load.non2xx ? null : load.latency.p97_5,
    });
  }
  return results;
};

/** Analytic routes over whole histories, beside the same aggregates in DuckDB in memory; answers asked for the first time after a change, and again. */
export const run = async (bench: Bench): Promise<void> => {
  const results: Measured[] = [];
  for (const rows of SIZES) results.push(...(await measure(bench, rows)));
  for (const r of results) {
    const rival =
      r.rivalMs === null
        ? ''
        : `, DuckDB ${ms(r.rivalMs)} ms: ratio ${(r.firstMs / r.rivalMs).toFixed(2)} first, ${(r.repeatedMs / r.rivalMs).toFixed(2)} again`;
    console.log(
      `${r.rows} records, ${r.route}: first ${ms(r.firstMs)} ms, again ${ms(r.repeatedMs)} ms${rival}; 20 readers p97.5 ${r.p95Ms20Readers} ms`,
    );
  }
  const machine = {
    cpu: cpus()[0]?.model,
    cores: cpus().length,
    arch: arch(),
    memoryGb: Math.round(totalmem() / 2 ** 30),
    node: process.version,
  };
  writeFileSync(
    'tests/bench/analytics.json',
    `${JSON.stringify({ measuredOn: new Date().toISOString(), machine, results }, null, 2)}\n`,
  );
};
