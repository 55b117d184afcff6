import { normalQuantile } from '@/analytics/statistics/distributions/normal';

/** Uniform numbers within 0 and 1, the same for the same seed: mulberry32 of Tommy Ettinger (public domain). */
export const uniforms = (seed: number) => {
  let state = seed >>> 0;
  return (): number => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return (((mixed ^ (mixed >>> 14)) >>> 0) + 0.5) / 4_294_967_296;
  };
};

/** Standard normal numbers, the same for the same seed. */
export const normals = (seed: number) => {
  const next = uniforms(seed);
  return (): number => normalQuantile(next());
};
