import { writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import autocannon from 'autocannon';
import { REQUEST_DIGEST } from '@/analytics/record-digest/request';
import { withConnection } from '@/db/cluster/roles';
import { createAccessToken, createCompany } from '@/lib/auth/provision';
import type { Bench } from '@/lib/launch/bench';
import { machine, quantile, tenth } from './machine';
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

const median = (values: number[]): number => tenth(quantile(values, 0.5));
const ratio = (ours: number, theirs: number | undefined): number | null =>
  theirs === undefined ? null : Math.round((100 * ours) / theirs) / 100;

/** One record gets another mass, so that nothing that was kept can be the answer. */
const touch = (adminUrl: string, companyId: string): Promise<void> =>
  withConnection(adminUrl, async (admin) => {
    await admin.query(`select set_config('app.company_id', $1, false), set_config('app.actor', 'bench', false)`, [
      companyId,
    ]);
    await admin.query(
      `update recoveries set recovered_mass_kg = 1 + 0.001 * (version % 1000) where company_id = $1 and record_ref = 'B-77'`,
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

/** Asks for a digest of the records as a change does, and waits until the background work is done; gives the ms. */
const digest = async (adminUrl: string, companyId: string, address: string, token: string): Promise<number> => {
  const began = performance.now();
  await withConnection(adminUrl, async (admin) => {
    await admin.query(`select set_config('app.company_id', $1, false)`, [companyId]);
    await admin.query(REQUEST_DIGEST, [companyId]);
  });
  const headers = { authorization: `Bearer ${token}` };
  for (;;) {
    const { pending } = await (await fetch(`${address}/api/work`, { headers })).json();
    if (pending === 0) return tenth(performance.now() - began);
    await sleep(50);
  }
};

type Digested = { rows: number; digestMs: number };
type Measured = {
  rows: number;
  route: string;
  firstMs: number;
  repeatedMs: number;
  rivalMs: number | null;
  p97Ms20Readers: number | null;
};

const measure = async (
  { database, served }: Bench,
  rows: number,
): Promise<{ digested: Digested; results: Measured[] }> => {
  const companyId = await createCompany(`bench ${rows} records`);
  const token = await createAccessToken(companyId, { role: 'owner', label: 'bench' });
  await fillCompany(database.urls.admin, companyId, rows);
  const digestMs = await digest(database.urls.admin, companyId, served.address, token);
  const rival = await rivalEngine(database.urls.admin, companyId, join('.local', `bench-${rows}.csv`));
  const results: Measured[] = [];
  for (const [route, path] of Object.entries(PAGES)) {
    const url = `${served.address}${path}`;
    const first: number[] = [];
    const repeated: number[] = [];
    const theirs: number[] = [];
    // The pair before the first that counts warms both.
    for (let pair = 0; pair <= PAIRS; pair++) {
      await touch(database.urls.admin, companyId);
      first[pair] = await timed(url, token);
      repeated[pair] = await timed(url, token);
      if (route in ROUTES) theirs[pair] = await rival(route as keyof typeof ROUTES);
    }
    const load = await autocannon({ url, connections: 20, duration: 5, headers: { authorization: `Bearer ${token}` } });
    results.push({
      rows,
      route,
      firstMs: median(first.slice(1)),
      repeatedMs: median(repeated.slice(1)),
      rivalMs: theirs.length ? median(theirs.slice(1)) : null,
      p97Ms20Readers: load.non2xx ? null : load.latency.p97_5,
    });
  }
  return { digested: { rows, digestMs }, results };
};

/** Each figure beside DuckDB's and beside the same one at the size before: a ratio of 10 is growth with the records. */
const withRatios = (results: Measured[]) =>
  results.map((one) => {
    const before = results.findLast(({ route, rows }) => route === one.route && rows < one.rows);
    return {
      ...one,
      firstToRival: one.rivalMs === null ? null : ratio(one.firstMs, one.rivalMs),
      repeatedToRival: one.rivalMs === null ? null : ratio(one.repeatedMs, one.rivalMs),
      growthOfFirst: ratio(one.firstMs, before?.firstMs),
    };
  });

/**
 * Analytic routes over whole histories, beside the same aggregates in DuckDB in memory; answers asked for the first time
 * after a change, and again. `npm run bench -- analytics 10000 100000` measures these sizes only.
 */
export const run = async (bench: Bench): Promise<void> => {
  const sizes = bench.args.length ? bench.args.map(Number) : SIZES;
  const measured: Measured[] = [];
  const digests: Digested[] = [];
  for (const rows of sizes) {
    const { digested, results: ofSize } = await measure(bench, rows);
    measured.push(...ofSize);
    digests.push(digested);
    const results = withRatios(measured);
    // Written size by size: the largest takes its time.
    writeFileSync(
      'tests/bench/analytics.json',
      `${JSON.stringify({ measuredOn: new Date().toISOString(), machine: machine(), digests, results }, null, 2)}\n`,
    );
    console.log(`digest of ${rows} records: ${digested.digestMs} ms`);
    console.table(results.filter((result) => result.rows === rows));
  }
};
