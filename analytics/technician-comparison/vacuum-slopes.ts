import type { Columns } from './columns';
import type { JobChances } from './job-chances';

/** To begin with, and never below: a gauge tells at least so much of what was left behind. */
const FIRST = 5;
const LEAST = 1.5;
/** Jobs' worth by which a kind's own slope is tied to that of all kinds, and that to the first guess. */
const PRIOR = 3;

export const firstSlopes = (groups: number): Float64Array => new Float64Array(groups).fill(FIRST);

/**
 * By vacuum kind, how many usual deviations shallower the vacuum gets for each share of the charge that is left: least
 * squares through the origin over pulls that look stopped early.
 */
export const vacuumSlopes = (columns: Columns, out: JobChances, counts: Uint8Array): Float64Array => {
  const [products, squares] = [new Float64Array(columns.vacuumKinds), new Float64Array(columns.vacuumKinds)];
  let [allProducts, allSquares] = [PRIOR * FIRST, PRIOR];
  for (let at = 0; at < columns.count; at++) {
    const shallower = out.shallower[at] ?? Number.NaN;
    const weight = out.early[at] ?? 0;
    if (!counts[at] || weight < 0.01 || Number.isNaN(shallower)) continue;
    const left = Math.max(0, 1 - (columns.yields[at] ?? 0) / Math.max(0.01, out.fullYield[at] ?? 1));
    const kind = columns.vacuumKind[at] ?? 0;
    products[kind] = (products[kind] ?? 0) + weight * left * shallower;
    squares[kind] = (squares[kind] ?? 0) + weight * left * left;
    allProducts += weight * left * shallower;
    allSquares += weight * left * left;
  }
  const overall = allProducts / allSquares;
  return products.map((sum, kind) => Math.max(LEAST, (sum + PRIOR * overall) / ((squares[kind] ?? 0) + PRIOR)));
};
