/** From this share of paths without anything on, a range begins at nothing. */
const OFTEN_EMPTY = 0.1;
const ALMOST_ALWAYS_EMPTY = 0.8;

/** Kg between which a share of the drawn paths lies. */
export type MassRange = { lowerKg: number; upperKg: number };

const at = (sorted: Float64Array, p: number): number => {
  const place = Math.min(sorted.length - 1, Math.max(0, p * (sorted.length - 1)));
  const below = Math.floor(place);
  const low = sorted[below] ?? 0;
  return low + (place - below) * ((sorted[below + 1] ?? low) - low);
};

/** Share of the sorted draws that are below a mass, and that are at most it. */
export const ranksOf = (sorted: Float64Array, kg: number): { below: number; atMost: number } => {
  const first = (than: (draw: number) => boolean) => {
    let [low, high] = [0, sorted.length];
    while (low < high) {
      const middle = (low + high) >> 1;
      if (than(sorted[middle] ?? 0)) low = middle + 1;
      else high = middle;
    }
    return low / sorted.length;
  };
  return { below: first((draw) => draw < kg), atMost: first((draw) => draw <= kg) };
};

const oftenEmpty = (sorted: Float64Array): boolean => ranksOf(sorted, 0).atMost >= OFTEN_EMPTY;

/**
 * The range that holds the share `mass` of sorted draws: as much outside on either side, but from nothing up where nothing
 * is a usual outcome, since then there is no lower side to leave out.
 */
export const rangeOf = (sorted: Float64Array, mass: number): MassRange =>
  oftenEmpty(sorted)
    ? { lowerKg: 0, upperKg: at(sorted, mass) }
    : { lowerKg: at(sorted, (1 - mass) / 2), upperKg: at(sorted, (1 + mass) / 2) };

/**
 * The share of the draws that a range must hold to just reach a mass. Null where a range says nothing, since the draws
 * are almost always nothing.
 */
export const reachOf = (sorted: Float64Array, kg: number): number | null => {
  if (ranksOf(sorted, 0).atMost > ALMOST_ALWAYS_EMPTY) return null;
  const { below, atMost } = ranksOf(sorted, kg);
  if (oftenEmpty(sorted)) return kg > 0 ? (below + atMost) / 2 : 0;
  return Math.abs(below + atMost - 1);
};
