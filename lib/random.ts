/** A source of chance that gives the same numbers for the same seed on every machine. */
export type Random = {
  /** Evenly from `low` up to, not including, `high`. */
  between: (low: number, high: number) => number;
  /** A whole number from `low` to `high`, both included. */
  integer: (low: number, high: number) => number;
  chance: (probability: number) => boolean;
  normal: (mean: number, standardDeviation: number) => number;
  beta: (a: number, b: number) => number;
  /** With scale 1: mean and variance are both the shape. */
  gamma: (shape: number) => number;
  poisson: (mean: number) => number;
  /** One of the list, by weight where one is given; throws on an empty list. */
  pick: <T>(list: readonly T[], weightOf?: (item: T) => number) => T;
  /** A source of its own: what one part draws does not move what another part gets. */
  fork: (name: string) => Random;
};

// FNV-1a, to turn a readable seed into 32 bits.
const hash = (text: string): number => {
  let h = 0x811c9dc5;
  for (let i = 0; i < text.length; i++) h = Math.imul(h ^ text.charCodeAt(i), 0x01000193);
  return h >>> 0;
};

/** sfc32 of PractRand (C. Doty-Humphrey): 128 bits of state, four whole-number operations a draw. */
const sfc32 = (seed: string) => {
  let [a, b, c, counter] = [hash(seed), hash(`${seed}/b`), hash(`${seed}/c`), 1];
  const draw = () => {
    const t = (a + b + counter++) | 0;
    a = b ^ (b >>> 9);
    b = (c + (c << 3)) | 0;
    c = (((c << 21) | (c >>> 11)) + t) | 0;
    return (t >>> 0) / 2 ** 32;
  };
  for (let i = 0; i < 12; i++) draw();
  return draw;
};

/** Makes a source of chance from a readable seed. */
export const seededRandom = (seed: string): Random => {
  const unit = sfc32(seed);
  const between = (low: number, high: number) => low + (high - low) * unit();
  const normal = (mean: number, standardDeviation: number) =>
    mean + standardDeviation * Math.sqrt(-2 * Math.log(1 - unit())) * Math.cos(2 * Math.PI * unit());
  // Marsaglia and Tsang, ACM TOMS 26 (2000); shapes below 1 by their own boost.
  const gamma = (shape: number): number => {
    if (shape < 1) return gamma(shape + 1) * (1 - unit()) ** (1 / shape);
    const d = shape - 1 / 3;
    for (;;) {
      const x = normal(0, 1);
      const v = (1 + x / Math.sqrt(9 * d)) ** 3;
      if (v > 0 && Math.log(1 - unit()) < 0.5 * x * x + d - d * v + d * Math.log(v)) return d * v;
    }
  };
  const poisson = (mean: number) => {
    let [count, product] = [0, unit()];
    for (const floor = Math.exp(-mean); product > floor; product *= unit()) count++;
    return count;
  };
  const pick = <T>(list: readonly T[], weightOf: (item: T) => number = () => 1): T => {
    let rest = unit() * list.reduce((sum, item) => sum + weightOf(item), 0);
    const chosen = list.find((item) => {
      rest -= weightOf(item);
      return rest < 0;
    });
    const last = chosen ?? list.at(-1);
    if (last === undefined) throw new Error('There is nothing to pick from.');
    return last;
  };
  return {
    between,
    integer: (low, high) => Math.floor(between(low, high + 1)),
    chance: (probability) => unit() < probability,
    normal,
    beta: (a, b) => {
      const x = gamma(a);
      return x / (x + gamma(b));
    },
    gamma,
    poisson,
    pick,
    fork: (name) => seededRandom(`${seed}/${name}`),
  };
};
