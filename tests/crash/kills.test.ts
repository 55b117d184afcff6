import { type ChildProcess, spawn } from 'node:child_process';
import { once } from 'node:events';
import { setTimeout as sleep } from 'node:timers/promises';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { withConnection } from '@/db/cluster/roles';
import type { ImportView } from '@/lib/imports/contract';
import { recoveryFile, seeded } from '../support/recovery-file';
import { openKillableDatabase } from './killable-database';

const ROWS = 5_000;
const ROUNDS = 10;
const KILLS_A_ROUND = 2;
/** Kills fall anywhere in the time that an import or an undo takes. */
const WITHIN_MS = 2_500;

let database: Awaited<ReturnType<typeof openKillableDatabase>>;
let worker: ChildProcess;
let imports: typeof import('../support/imports');
let token: string;

const startWorkerProcess = () => {
  worker = spawn(process.execPath, ['--conditions=react-server', '--import', 'tsx', 'tests/crash/worker-process.ts'], {
    stdio: 'ignore',
  });
};

const killWorker = async () => {
  // Only the test may end it: a database that goes away must not.
  expect(worker.exitCode).toBe(null);
  const ended = once(worker, 'exit');
  worker.kill('SIGKILL');
  await ended;
  startWorkerProcess();
};

beforeAll(async () => {
  database = await openKillableDatabase();
  const { urls, secret } = database;
  Object.assign(process.env, { SERVER_DATABASE_URL: urls.server, JOB_DATABASE_URL: urls.job, NEXTAUTH_SECRET: secret });
  // Loaded only now: these modules read the environment when they load.
  imports = await import('../support/imports');
  const { newCompany } = await import('../support/company');
  token = await (await newCompany()).token('owner');
  startWorkerProcess();
});
afterAll(() => {
  worker.kill('SIGKILL');
  database.destroy();
});

type State = { id: string; status: string; added: number; records: number; lines: number };

/** Each import with what it really left in the tables, seen at one moment. */
const states = (): Promise<State[]> =>
  withConnection(database.urls.admin, async (admin) => {
    const { rows } = await admin.query<State>(`
      select id, status, added, (select count(*)::int from recoveries r where r.import_id = i.id) as records,
             (select count(*)::int from import_rows l where l.import_id = i.id) as lines
      from imports i`);
    return rows;
  });

/** All of an import or nothing of it: what is done is there, what is not done or is undone is not. */
const expectNothingHalf = async () => {
  for (const { id, status, added, records, lines } of await states()) {
    const whole = status === 'done' ? ROWS : 0;
    expect({ id, status, records }).toEqual({ id, status, records: whole });
    if (status === 'done') expect({ id, added, lines }).toEqual({ id, added: ROWS, lines: ROWS });
    if (status !== 'done' && status !== 'undone') expect({ id, lines }).toEqual({ id, lines: 0 });
  }
};

/** Does it until the database answers; a refusal by the server itself is an answer. */
const persistently = async <T>(work: () => Promise<T>): Promise<T> => {
  for (;;) {
    try {
      return await work();
    } catch {
      await sleep(50);
    }
  }
};

const undone = (id: string): Promise<ImportView> =>
  persistently(async () => {
    // An undo asked for again while one is under way, or after it, is refused and does no harm.
    await imports.takeBack(token, id);
    const view = await imports.look(token, id);
    if (view.status !== 'undone') throw new Error('not yet');
    return view;
  });

test('killed at any moment, an import or its undo is whole or not there, and what was promised is done', async () => {
  const random = seeded(20_260_801);
  const promised: string[] = [];
  const lines: string[] = [];
  let kills = 0;
  const killOften = async () => {
    for (let nth = 0; nth < KILLS_A_ROUND; nth += 1) {
      const wait = Math.round(random() * WITHIN_MS);
      const whom = random() < 0.5 ? 'worker' : 'database';
      await sleep(wait);
      const began = performance.now();
      await (whom === 'worker' ? killWorker() : database.killAndStart());
      kills += 1;
      lines.push(`${whom} after ${wait} ms, back after ${Math.round(performance.now() - began)} ms`);
      await expectNothingHalf();
    }
  };
  for (let round = 0; round < ROUNDS; round += 1) {
    const file = [...recoveryFile(ROWS, round, `R${round}`)].join('');
    const killing = killOften();
    const undoing = round % 3 === 2 && promised[round - 1];
    const work = undoing ? undone(undoing) : imports.send(token, file).catch(() => null);
    const answer = await work;
    if (answer instanceof Response && answer.status === 202)
      promised[round] = ((await answer.json()) as { id: string }).id;
    await killing;
    const began = performance.now();
    const id = promised[round];
    if (id) expect(await persistently(() => imports.settled(token, id))).toMatchObject({ status: 'done', added: ROWS });
    await expectNothingHalf();
    lines.push(`round ${round}: done ${Math.round(performance.now() - began)} ms after the last kill`);
  }
  console.log(lines.join('\n'));
  expect(kills).toBeGreaterThanOrEqual(20);
  expect(promised.filter(Boolean).length).toBeGreaterThan(3);
  // Nothing is left that nobody works on: also what was kept although its answer was lost is done.
  for (const { id, status } of await persistently(async () => {
    const all = await states();
    if (all.some(({ status }) => status === 'queued' || status === 'running')) throw new Error('not yet');
    return all;
  }))
    expect({ id, status }).toMatchObject({ status: expect.stringMatching(/^(done|undone)$/) });
  await expectNothingHalf();
}, 600_000);
