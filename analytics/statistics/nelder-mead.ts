import { requireFinite } from './checked';

type Vertex = { at: number[]; value: number };
export type SimplexOptions = {
  /** Length of the first simplex's edges. */
  step?: number;
  /** It stops when the values of the simplex lie this near to each other, relative to the best. */
  tolerance?: number;
  /** It stops after about this many looks at the function. */
  mostLooks?: number;
  /** How often it starts again from the best point with a fresh simplex; it stops earlier when that gains nothing. */
  restarts?: number;
};

// A point at which the function cannot be computed is simply worse than any other.
const look = (valley: (at: readonly number[]) => number, at: number[]): Vertex => {
  const value = valley(at);
  return { at, value: Number.isNaN(value) ? Number.POSITIVE_INFINITY : value };
};

/** The point on the line from `from` through `to`, `share` of the way. */
const along = (from: readonly number[], to: readonly number[], share: number): number[] => {
  const point = new Array<number>(from.length);
  for (let axis = 0; axis < from.length; axis++) {
    const start = from[axis] ?? 0;
    point[axis] = start + share * ((to[axis] ?? 0) - start);
  }
  return point;
};

/** The middle of all vertices but the last. */
const centreOfRest = (simplex: readonly Vertex[], dimensions: number): number[] => {
  const centre = new Array<number>(dimensions).fill(0);
  for (let corner = 0; corner < dimensions; corner++) {
    const at = simplex[corner]?.at ?? centre;
    for (let axis = 0; axis < dimensions; axis++) centre[axis] = (centre[axis] ?? 0) + (at[axis] ?? 0) / dimensions;
  }
  return centre;
};

const byValue = (a: Vertex, b: Vertex) => a.value - b.value;

/** Puts a vertex in the last one's stead, in its place by value. */
const replaceWorst = (simplex: Vertex[], vertex: Vertex): void => {
  simplex.pop();
  let place = simplex.length;
  while (place > 0 && (simplex[place - 1]?.value ?? 0) > vertex.value) place -= 1;
  simplex.splice(place, 0, vertex);
};

const descend = (
  valley: (at: readonly number[]) => number,
  start: Vertex,
  { step, tolerance, mostLooks }: Required<Omit<SimplexOptions, 'restarts'>>,
): Vertex => {
  const dimensions = start.at.length;
  const expansion = 1 + 2 / dimensions;
  const contraction = 0.75 - 1 / (2 * dimensions);
  const shrinkage = 1 - 1 / Math.max(dimensions, 2);
  const corners = start.at.map((_, axis) =>
    look(
      valley,
      start.at.map((coordinate, index) => (index === axis ? coordinate + step : coordinate)),
    ),
  );
  let simplex = [start, ...corners].sort(byValue);
  for (let looks = dimensions + 1; looks < mostLooks; ) {
    const best = simplex[0] ?? start;
    const worst = simplex[dimensions] ?? best;
    if (worst.value - best.value <= tolerance * (Math.abs(best.value) + tolerance)) break;
    const secondWorst = simplex[dimensions - 1] ?? best;
    const centre = centreOfRest(simplex, dimensions);
    const reflected = look(valley, along(centre, worst.at, -1));
    looks += 1;
    let replacement: Vertex | null = null;
    if (reflected.value < best.value) {
      const expanded = look(valley, along(centre, worst.at, -expansion));
      looks += 1;
      replacement = expanded.value < reflected.value ? expanded : reflected;
    } else if (reflected.value < secondWorst.value) {
      replacement = reflected;
    } else {
      const outside = reflected.value < worst.value;
      const contracted = look(valley, along(centre, worst.at, outside ? -contraction : contraction));
      looks += 1;
      if (contracted.value <= Math.min(reflected.value, worst.value)) replacement = contracted;
    }
    if (replacement) {
      replaceWorst(simplex, replacement);
      continue;
    }
    simplex = simplex.map((vertex) => (vertex === best ? best : look(valley, along(best.at, vertex.at, shrinkage))));
    simplex.sort(byValue);
    looks += dimensions;
  }
  return simplex[0] ?? start;
};

/**
 * A point where a function of several variables is low, by the simplex of Nelder & Mead (1965), Computer Journal 7,
 * 308-313, with the steps of Gao & Han (2012), Computational Optimization and Applications 51, 259-277, which fit the
 * number of variables. It finds a valley, not surely the deepest: give it several starts. Throws a RangeError on a start
 * that is no point.
 */
export const nelderMead = (
  valley: (at: readonly number[]) => number,
  start: readonly number[],
  { step = 0.5, tolerance = 1e-8, mostLooks = 400 * start.length, restarts = 3 }: SimplexOptions = {},
): { at: readonly number[]; value: number } => {
  requireFinite(start, 'The start');
  let best = look(valley, [...start]);
  for (let round = 0; round <= restarts; round++) {
    // Each fresh simplex points the other way, so that a flattened one is not made again.
    const found = descend(valley, best, { step: round % 2 === 0 ? step : -step / 2, tolerance, mostLooks });
    const gain = best.value - found.value;
    best = found.value < best.value ? found : best;
    if (round > 0 && gain <= 10 * tolerance * (Math.abs(best.value) + tolerance)) break;
  }
  return best;
};
