import { expect, test } from 'vitest';
import { technicianEffects } from '@/analytics/statistics/comparison/technician-effects';
import { logBeta } from '@/analytics/statistics/distributions/log-gamma';
import { toColumns } from '@/analytics/technician-comparison/columns';
import { chanceOfSoMany, usualShare } from '@/analytics/technician-comparison/early-stops';
import { judgedJobs } from '@/analytics/technician-comparison/judged-jobs';
import { normalSpread } from '@/analytics/technician-comparison/normal-spread';
import { plainEffects } from '@/analytics/technician-comparison/plain-effects';
import { given } from '../statistics/given';
import { crewOf, crewWith } from './crew';

test('plain effects from columns are those of the method that R confirms', () => {
  const jobs = crewOf(crewWith({ id: 'Ben', leaks: 0.7 }, { id: 'Eve', category: 'other', leaves: 0.1 }), 5);
  const columns = toColumns(jobs);
  const ours = plainEffects(columns, judgedJobs(columns, new Map()));
  const theirs = given(
    technicianEffects(
      jobs.map(({ technicianId, category, jobType, recoveredMassKg, fullChargeKg }) => ({
        technician: technicianId,
        category: `${category}`,
        jobType: `${jobType}`,
        recoveryYield: recoveredMassKg / fullChargeKg,
      })),
    ),
  );
  theirs.technicians.forEach((their, person) => {
    const own = ours.technicians[person];
    expect(own?.jobs).toBe(their.jobs);
    expect(own?.weakJobs).toBe(their.weakJobs);
    expect(own?.effect).toBeCloseTo(their.effect, 10);
    expect(own?.standardError).toBeCloseTo(their.standardError, 10);
    expect(own?.mean).toBeCloseTo(their.plainMean, 10);
  });
});

test('so many early stops: the beta-binomial tail', () => {
  const [share, tie, jobs] = [0.02, 100, 40];
  // P(X ≥ 1) = 1 − B(a, b + n)/B(a, b) with a = share × tie (Skellam 1948).
  const [a, b] = [share * tie, (1 - share) * tie];
  expect(chanceOfSoMany({ early: 1, of: jobs }, share)).toBeCloseTo(
    1 - Math.exp(logBeta(a, b + jobs) - logBeta(a, b)),
    10,
  );
  expect(chanceOfSoMany({ early: 0.3, of: jobs }, share)).toBe(1);
  const falling = [1, 3, 6, 12, 40].map((early) => chanceOfSoMany({ early, of: jobs }, share));
  expect(falling).toEqual(falling.toSorted((x, y) => y - x));
});

test('the usual share of early stops leaves out those with the most', () => {
  const crew = [...Array.from({ length: 9 }, () => ({ early: 2, of: 100 })), { early: 40, of: 100 }];
  expect(usualShare(crew)).toBeCloseTo(0.02, 12);
  expect(usualShare([])).toBe(0.01);
});

test('two who are far off do not widen what is normal', () => {
  const sound = [-0.02, -0.01, -0.005, 0, 0.005, 0.01, 0.02, 0.015, -0.015];
  const errors = (count: number) => Array.from({ length: count }, () => 0.005);
  const without = normalSpread(sound, errors(9), 0.015);
  const withTwo = normalSpread([...sound, -0.15, -0.2], errors(11), 0.015);
  expect(withTwo.spread).toBeLessThan(1.5 * without.spread);
  expect(normalSpread([], [], 0.015)).toMatchObject({ centre: 0, spread: 0.015 });
});
