import { APPLIANCE_CATEGORIES, JOB_TYPES } from '@/lib/vocabulary';
import type { TestRecord } from './records';

/** A repeatable sequence of numbers from 0 up to 1 (mulberry32). */
export const randomNumbers = (seed: number) => {
  let state = seed;
  return () => {
    state = (state + 0x6d2b79f5) | 0;
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state);
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed;
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
};

/** What random records are made of; also what random scopes name. Names hold what an address must escape. */
export const RANDOM_NAMES = {
  refrigerant: ['R-22', 'R-410A', 'R-134a'],
  technician: ['Ann Lee', 'Bo & Sons', 'Čeněk, J. + 1', "O'Hara"],
  site: ['North Yard', 'A=B? #3', '100 % Ice', 'Süd', 'Pier 5'],
  branch: ['East', 'West/2', null],
  category: [APPLIANCE_CATEGORIES[0], APPLIANCE_CATEGORIES[1], null],
  jobType: [...JOB_TYPES, null],
} as const;

/**
 * Records over 14 months, masses in whole grams. Three in ten leave a value unstated somewhere, one in twelve is an
 * entry error, and one in nine is far too low.
 */
export const randomRecords = (count: number, seed: number): TestRecord[] => {
  const random = randomNumbers(seed);
  const one = <Value>(values: readonly Value[]): Value => values[Math.floor(random() * values.length)] as Value;
  return Array.from({ length: count }, (_, index) => {
    const day = new Date(Date.UTC(2025, 9, 1 + Math.floor(random() * 425)));
    const chargeGrams = 500 + Math.floor(random() * 60_000);
    const share = random() < 0.11 ? random() * 0.2 : 0.75 + random() * 0.25;
    return {
      ref: `random-${seed}-${index}`,
      on: day.toISOString().slice(0, 10),
      chargeKg: (chargeGrams / 1000).toFixed(3),
      kg: (Math.floor(chargeGrams * share) / 1000).toFixed(3),
      refrigerant: one(RANDOM_NAMES.refrigerant),
      technician: one(RANDOM_NAMES.technician),
      site: one(RANDOM_NAMES.site),
      appliance: one(['RTU-1', 'RTU-2']),
      branch: one(RANDOM_NAMES.branch),
      category: one(RANDOM_NAMES.category),
      jobType: one(RANDOM_NAMES.jobType),
      ...one([{}, { holdMinutes: 0 }, { holdMinutes: 10 }]),
      ...one([{}, { vacuumKpaAbs: '60' }, { vacuumKpaAbs: '95' }, { vacuumKpaAbs: '110' }]),
      excluded: random() < 1 / 12,
    };
  });
};
