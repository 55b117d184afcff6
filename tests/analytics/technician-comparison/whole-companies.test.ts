import { readFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import { compareTechnicians } from '@/analytics/technician-comparison/compare-technicians';
import { simulateCompany } from '@/seed/simulation/simulate-company';
import { comparedRecoveriesOf } from '../../bench/technicians/simulated';

const below = (results: ReturnType<typeof compareTechnicians>): string[] =>
  results.technicians.filter(({ verdict }) => verdict === 'below').map(({ technicianId }) => technicianId);

// The planted people of the sample company, simulated outside of this project (tests/fixtures/sample-company): one of
// low skill, one who stops early, a scale that reads 8.8 % low from June 2025 on.
test('in a company that nobody here shaped, those two are below and that scale is a scale', async () => {
  const file = readFileSync('tests/fixtures/sample-company/recoveries.csv', 'utf8');
  const results = compareTechnicians(await comparedRecoveriesOf(file));
  expect(below(results).toSorted()).toEqual(['Quinn Cruz', 'Wren Ueda']);
  const of = (name: string) => results.technicians.find(({ technicianId }) => technicianId === name);
  expect(of('Quinn Cruz')?.restsOn).toBe('early stops');
  expect(of('Wren Ueda')?.restsOn).toBe('usual pull');
  expect(results.technicians.filter(({ scale }) => scale).map(({ technicianId }) => technicianId)).toEqual([
    'Jules Vance',
  ]);
  expect(of('Jules Vance')?.scale?.from.slice(0, 7)).toBe('2025-06');
});

test('in simulated companies most of the poor are found, and nobody else is accused', async () => {
  let [poor, found, scales, called] = [0, 0, 0, 0];
  for (const number of [1, 2, 3]) {
    const { file, truth } = simulateCompany(`technicians ${number}`);
    const results = compareTechnicians(await comparedRecoveriesOf(file));
    const planted = truth.technicians
      .filter(({ class: of, records }) => of.startsWith('bad_') && records >= 60)
      .map(({ name }) => name);
    poor += planted.length;
    found += below(results).filter((name) => planted.includes(name)).length;
    expect(below(results).filter((name) => !truth.planted_bad_technicians.includes(name))).toEqual([]);
    scales += truth.planted_drifting_scale.length;
    called += truth.planted_drifting_scale.filter(({ technician }) =>
      results.technicians.some(({ technicianId, scale }) => technicianId === technician && scale),
    ).length;
  }
  expect(poor).toBe(6);
  expect(found).toBeGreaterThanOrEqual(5);
  expect(called / scales).toBeGreaterThan(0.6);
});
