import type { Random } from '../random';
import type { Worker } from './crew';
import type { SimulatedCylinder } from './cylinders';
import type { Kind } from './kinds';

/** What the scale said, as text in pounds. */
export type Weighing = { start: string; end: string; recovered: string };

/** Rounding noise of floating point away, no trailing zeros: how an office's sheet shows a number. */
export const plain = (value: number, places = 4): string => String(Number(value.toFixed(places)));

const stepFor = (kind: Kind, worker: Worker): number => {
  if (kind.name === 'small') return 0.02;
  if (kind.isLarge) return 0.5;
  return worker.roundsToPounds ? 1 : 0.1;
};

/** Spread of one reading around what stands on the scale. */
const repeatability = (kind: Kind): number => (kind.isLarge ? 0.2 : 0.05);

/** Weighs a pull of `lb` into the cylinder, which is heavier by it afterwards. */
export const weigh = (
  cylinder: SimulatedCylinder,
  lb: number,
  job: { kind: Kind; worker: Worker; month: string },
  random: Random,
): Weighing => {
  const { drift } = job.worker;
  const step = stepFor(job.kind, job.worker);
  const read = drift && job.month >= drift.fromMonth ? lb * drift.factor : lb;
  const steps = (value: number) => Math.round(value / step) * step;
  const start = steps(cylinder.grossLb + random.normal(0, repeatability(job.kind)));
  const recovered = Math.max(0, steps(read));
  const end = start + recovered;
  cylinder.grossLb = end;
  return { start: plain(start), end: plain(end), recovered: plain(recovered) };
};
