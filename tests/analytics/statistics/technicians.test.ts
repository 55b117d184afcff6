import { expect, test } from 'vitest';
import { expectedYields, type Job } from '@/analytics/statistics/comparison/case-mix';
import { observedOverExpected } from '@/analytics/statistics/comparison/observed-over-expected';
import { randomIntercept } from '@/analytics/statistics/comparison/random-intercept';
import { secondOpinion } from '@/analytics/statistics/comparison/second-opinion';
import { compareTechnicians } from '@/analytics/statistics/comparison/technician-comparison';
import { technicianEffects } from '@/analytics/statistics/comparison/technician-effects';
import { jobsNeeded, whetherJudged } from '@/analytics/statistics/comparison/who-is-judged';
import { given } from './given';
import { normals, uniforms } from './random';

type Person = { name: string; shortfall: number; leakShare: number };

/** An invented crew: leak repairs give half of the charge, other jobs nearly all, each with luck about it. */
const crew = (people: Person[], jobsEach: number, seed: number): Job[] => {
  const luck = normals(seed);
  const draw = uniforms(seed + 1);
  return people.flatMap(({ name, shortfall, leakShare }) =>
    Array.from({ length: jobsEach }, () => {
      const leak = draw() < leakShare;
      const recoveryYield = Math.max(0, (leak ? 0.5 + 0.2 * luck() : 0.93 + 0.04 * luck()) - shortfall);
      const category = draw() < 0.5 ? 'split' : 'rooftop';
      return { technician: name, category, jobType: leak ? 'leak_repair' : 'service', recoveryYield };
    }),
  );
};

const people = ['Ada', 'Ben', 'Cleo', 'Dan', 'Eve', 'Finn', 'Gus', 'Hal'].map((name) => ({
  name,
  shortfall: 0,
  leakShare: 0.2,
}));

test('the leak specialist is not held to the others’ easy jobs', () => {
  const jobs = crew(
    people.map((person) => (person.name === 'Ben' ? { ...person, leakShare: 0.9 } : person)),
    150,
    7,
  );
  const { technicians } = given(compareTechnicians(given(technicianEffects(jobs)).technicians));
  const raw = (name: string) => {
    const own = jobs.filter((job) => job.technician === name);
    return own.reduce((sum, job) => sum + job.recoveryYield, 0) / own.length;
  };
  expect(raw('Ben')).toBeLessThan(raw('Ada') - 0.2);
  expect(technicians.map(({ finding }) => finding)).not.toContain('clear');
});

test('one who recovers ten points less is told apart, by about ten points', () => {
  const jobs = crew(
    people.map((person) => (person.name === 'Cleo' ? { ...person, shortfall: 0.1 } : person)),
    150,
    11,
  );
  const { technicians } = given(compareTechnicians(given(technicianEffects(jobs)).technicians));
  const cleo = technicians.find(({ technician }) => technician === 'Cleo');
  expect(cleo?.finding).toBe('clear');
  expect(cleo?.shrunk.lower).toBeLessThan(-0.1);
  expect(cleo?.shrunk.upper).toBeGreaterThan(-0.1);
  expect(technicians.filter(({ finding }) => finding === 'clear').map(({ technician }) => technician)).toEqual([
    'Cleo',
  ]);
  const opinion = given(secondOpinion(jobs));
  expect([...opinion].sort(([, a], [, b]) => a - b)[0]?.[0]).toBe('Cleo');
});

test('the order of the jobs does not matter', () => {
  const jobs = crew(people, 30, 3);
  const forth = given(technicianEffects(jobs)).technicians;
  const back = given(technicianEffects([...jobs].reverse())).technicians;
  back.forEach((own, index) => {
    expect(own.technician).toBe(forth[index]?.technician);
    expect(own.effect).toBeCloseTo(forth[index]?.effect ?? Number.NaN, 12);
  });
});

test('with few technicians nothing is called clear', () => {
  const jobs = crew([{ name: 'Ada', shortfall: 0.3, leakShare: 0.2 }, ...people.slice(1, 4)], 100, 5);
  const { technicians, spread } = given(compareTechnicians(given(technicianEffects(jobs)).technicians));
  expect(spread).toEqual({ enough: false, needs: 5, has: 4, of: 'members' });
  expect(technicians[0]?.finding).toBe('worth a look');
  expect(technicians[0]?.allowingP).toBeNull();
});

test('a job that no colleague did is marked, and expected from the job type', () => {
  const job = { category: 'split', jobType: 'service', recoveryYield: 0.9 };
  const jobs = [
    { ...job, technician: 'Ada', category: 'chiller', recoveryYield: 0.5 },
    { ...job, technician: 'Ben' },
    { ...job, technician: 'Cleo', recoveryYield: 0.7 },
  ];
  const [ada, ben] = given(expectedYields(jobs));
  expect(ada).toMatchObject({ weak: true });
  expect(ada?.expected).toBeCloseTo(0.8, 12);
  // Colleagues' split services: 0.7 once, and five times the mean of their services, 0.6: 3.7/6.
  expect(ben?.expected).toBeCloseTo(3.7 / 6, 12);
  expect(expectedYields(jobs.slice(0, 1))).toEqual({ enough: false, needs: 2, has: 1, of: 'technicians' });
  expect(() => expectedYields([{ ...job, technician: 'Ada', recoveryYield: Number.NaN }])).toThrow('A yield must be');
});

test('equal jobs have no differences to judge by', () => {
  const job = { category: 'split', jobType: 'service', recoveryYield: 0.9 };
  const jobs = ['Ada', 'Ada', 'Ben', 'Ben'].map((technician) => ({ ...job, technician }));
  expect(technicianEffects(jobs)).toMatchObject({ enough: false, of: 'differences between jobs' });
  expect(secondOpinion(jobs)).toMatchObject({ enough: false, needs: 2, has: 0 });
});

test('who is judged at all, and how many jobs it takes', () => {
  expect(whetherJudged({ jobs: 19, weakJobs: 0 })).toEqual({ judged: false, because: 'too few jobs' });
  expect(whetherJudged({ jobs: 30, weakJobs: 10 })).toEqual({ judged: true });
  expect(whetherJudged({ jobs: 30, weakJobs: 11 })).toMatchObject({ judged: false });
  // (2.8 × 0.24/0.10)² = 45.2.
  expect(jobsNeeded(0.1, 0.24)).toBe(46);
});

test('mass over expected mass is 1 where all do alike, whatever the sizes', () => {
  const jobs = ['Ada', 'Ben', 'Cleo'].flatMap((technician, index) =>
    [2, 40, 7].map((fullCharge) => ({
      technician,
      cell: 'split',
      fullCharge: fullCharge + index,
      recovered: 0.9 * (fullCharge + index),
    })),
  );
  const { technicians } = given(observedOverExpected(jobs));
  for (const { ratio, effectiveJobs } of technicians) {
    expect(ratio).toBeCloseTo(1, 12);
    expect(effectiveJobs).toBeLessThan(3);
  }
  expect(observedOverExpected(jobs.slice(0, 3))).toMatchObject({ enough: false, needs: 2, has: 1 });
});

test('levels of groups are found about a common slope', () => {
  const luck = normals(42);
  const rows = ['A', 'B', 'C', 'D', 'E', 'F'].flatMap((group, index) =>
    Array.from({ length: 20 }, (_, at) => ({ group, x: at, y: 10 * index + 2 * at + luck() })),
  );
  const fit = given(
    randomIntercept(
      rows.map(({ y }) => y),
      rows.map(({ group }) => group),
      rows.map(({ x }) => [1, x]),
    ),
  );
  // Levels 0, 10, … 50 have the variance 350; the luck has 1.
  expect(fit.coefficients[1]).toBeCloseTo(2, 1);
  expect(fit.groupVariance).toBeGreaterThan(250);
  expect(fit.groupVariance).toBeLessThan(450);
  expect(Math.abs(fit.residualVariance - 1)).toBeLessThan(0.4);
  expect(() =>
    randomIntercept(
      [1, 2, 3, 4, 5],
      ['A', 'A', 'B', 'B', 'B'],
      [
        [1, 1],
        [1, 1],
        [1, 1],
        [1, 1],
        [1, 1],
      ],
    ),
  ).toThrow('Columns of the design depend on each other');
  expect(randomIntercept([1, 2], ['A', 'A'], [[1], [1]])).toMatchObject({ enough: false, needs: 2, of: 'groups' });
});
