import { runNode } from '../children';
import { oneCheck, type Tally } from './tally';

/** Format, lint and import rules, as one check. */
export const lint = async (): Promise<Tally> => {
  const { code, output } = await runNode([
    'node_modules/@biomejs/biome/bin/biome',
    'ci',
    `--colors=${process.stderr.isTTY ? 'force' : 'off'}`,
    '.',
  ]);
  return oneCheck(code, output);
};

/** The types of routes, made from the files, and then of everything, as one check. */
export const types = async (): Promise<Tally> => {
  const routes = await runNode(['node_modules/next/dist/bin/next', 'typegen'], {
    environment: { ...process.env, NEXT_TELEMETRY_DISABLED: '1' },
  });
  if (routes.code !== 0) return oneCheck(routes.code, routes.output);
  const { code, output } = await runNode(['node_modules/typescript/bin/tsc', '--noEmit']);
  return oneCheck(code, output);
};
