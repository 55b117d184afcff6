import { deviations, MAD_TO_SIGMA } from '../statistics/robust/deviations';
import type { Columns } from './columns';

/** Where the search for the usual pull begins: yield of a full system by kind, vacuum and its deviation by its kind. */
export type StartingPoint = { yields: number[]; vacuums: number[]; vacuumDeviations: number[] };

const BIN = 0.02;
const [FROM, TO] = [0.5, 1.2];
/** Records of a kind from which its own peak is looked for. */
const LEAST = 20;

/** The yield at which most records lie, of those that recovered at least half: leaked systems spread wide below it. */
const peakOf = (yields: readonly number[]): number | null => {
  const bins = new Array<number>(Math.round((TO - FROM) / BIN)).fill(0);
  let counted = 0;
  for (const value of yields) {
    if (value < FROM || value >= TO) continue;
    const bin = Math.min(bins.length - 1, Math.floor((value - FROM) / BIN));
    bins[bin] = (bins[bin] ?? 0) + 1;
    counted += 1;
  }
  if (counted < LEAST) return null;
  const smooth = bins.map((own, at) => 2 * own + (bins[at - 1] ?? 0) + (bins[at + 1] ?? 0));
  return FROM + BIN * (smooth.indexOf(Math.max(...smooth)) + 0.5);
};

const grouped = (values: Float64Array, group: Int32Array, groups: number): number[][] => {
  const all = Array.from({ length: groups }, (): number[] => []);
  values.forEach((value, at) => {
    if (!Number.isNaN(value)) all[group[at] ?? 0]?.push(value);
  });
  return all;
};

/** A vacuum whose usual deviation is 0 tells nothing: everybody writes the same. */
export const startingPoint = (columns: Columns): StartingPoint => {
  const overall = peakOf([...columns.yields]) ?? 1;
  const spreads = grouped(columns.vacuums, columns.vacuumKind, columns.vacuumKinds).map(deviations);
  return {
    yields: grouped(columns.yields, columns.kind, columns.kinds).map((values) => peakOf(values) ?? overall),
    vacuums: spreads.map((spread) => (spread.enough ? spread.value.median : Number.NaN)),
    vacuumDeviations: spreads.map((spread) => (spread.enough ? MAD_TO_SIGMA * spread.value.mad : 0)),
  };
};
