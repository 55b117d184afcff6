import { arch, cpus, loadavg, totalmem } from 'node:os';

/** What a figure was measured on. `load` is what else the machine was doing: the average of the last minute. */
export const machine = () => ({
  cpu: cpus()[0]?.model,
  cores: cpus().length,
  arch: arch(),
  memoryGb: Math.round(totalmem() / 2 ** 30),
  node: process.version,
  load: Math.round((loadavg()[0] ?? 0) * 10) / 10,
});

/** The value that a share of the values does not exceed: the nearest rank, so it is one of them. Throws on none. */
export const quantile = (values: readonly number[], share: number): number => {
  const found = values.toSorted((a, b) => a - b)[Math.max(0, Math.ceil(share * values.length) - 1)];
  if (found === undefined) throw new Error('There is no quantile of nothing');
  return found;
};

/** Milliseconds or a ratio, to the tenth. */
export const tenth = (value: number): number => Math.round(value * 10) / 10;
