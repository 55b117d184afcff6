import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { createAccessToken, createCompany } from '@/lib/auth/provision';
import type { Bench } from '@/lib/launch/bench';
import { recoveryFile } from '../support/recovery-file';
import { companyApi } from './company-api';
import { copyBaseline } from './copy-baseline';

const SIZES = [100_000, 200_000];

/** The most memory a process has had in its life, in MB (VmHWM of proc(5)). */
const peakMb = (pid: number): number =>
  Number(/VmHWM:\s+(\d+)/.exec(readFileSync(`/proc/${pid}/status`, 'utf8'))?.[1] ?? 0) / 1024;

const upload = (address: string, token: string, rows: number) =>
  companyApi(address, token).importFile(`${rows}.csv`, [...recoveryFile(rows, rows, `N${rows}`)]);

/** How long a file takes from the first byte sent to the last record there, against COPY of the same rows; memory. */
export const run = async ({ database, served }: Bench): Promise<void> => {
  const pid = served.process.pid ?? 0;
  for (const rows of SIZES) {
    const companyId = await createCompany(`bench ${rows}`);
    const token = await createAccessToken(companyId, { role: 'owner', label: 'bench' });
    const first = await upload(served.address, token, rows);
    const again = await upload(served.address, token, rows);
    const { real, bare } = await copyBaseline(database.urls.admin, companyId, join('.local', `bench-${rows}.copy`));
    console.log(
      [
        `import of ${rows} rows: ${first.seconds.toFixed(1)} s, ${first.view.added} added, ${first.view.rejected} refused`,
        `  the same file again: ${again.seconds.toFixed(1)} s, ${again.view.unchanged} unchanged`,
        `  COPY into the table with its triggers: ${real.toFixed(1)} s, ratio ${(first.seconds / real).toFixed(1)}`,
        `  COPY into its columns and indexes only: ${bare.toFixed(1)} s, ratio ${(first.seconds / bare).toFixed(1)}`,
        `  most memory of the server process so far: ${peakMb(pid).toFixed(0)} MB`,
      ].join('\n'),
    );
  }
};
