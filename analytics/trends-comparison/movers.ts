import { kgToGram } from '@/lib/units';
import type { Comparison } from './contract';

/** Most keys named as what moved; the others are told together. */
export const MOST_MOVERS = 8;

/** Keys by how much their mass differs, the largest first; a key that either side lacks has nothing there. */
export const moversOf = (
  now: ReadonlyMap<string, number>,
  before: ReadonlyMap<string, number>,
): Pick<Comparison, 'movers' | 'otherKeys'> => {
  const all = [...new Set([...now.keys(), ...before.keys()])]
    .map((key) => {
      const [massNow, massBefore] = [now.get(key) ?? 0, before.get(key) ?? 0];
      return { key, now: massNow, before: massBefore, difference: kgToGram(massNow - massBefore) };
    })
    .sort((a, b) => Math.abs(b.difference) - Math.abs(a.difference) || (a.key < b.key ? -1 : 1));
  const others = all.slice(MOST_MOVERS);
  return {
    movers: all.slice(0, MOST_MOVERS),
    otherKeys: {
      keys: others.length,
      difference: kgToGram(others.reduce((sum, { difference }) => sum + difference, 0)),
    },
  };
};
