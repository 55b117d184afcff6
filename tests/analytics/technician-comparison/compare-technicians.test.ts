import { expect, test } from 'vitest';
import { compareTechnicians } from '@/analytics/technician-comparison/compare-technicians';
import type { ComparedRecovery } from '@/analytics/technician-comparison/recovery';
import type { TechnicianResult } from '@/analytics/technician-comparison/technician-result';
import { alike, crewOf, crewWith } from './crew';

const judged = (recoveries: readonly ComparedRecovery[]): Map<string, TechnicianResult> =>
  new Map(compareTechnicians(recoveries).technicians.map((own) => [own.technicianId, own]));

const below = (results: Map<string, TechnicianResult>): string[] =>
  [...results.values()].filter(({ verdict }) => verdict === 'below').map(({ technicianId }) => technicianId);

test('people who work alike are within, over many crews', () => {
  for (let seed = 1; seed <= 6; seed++) expect(below(judged(crewOf(alike, seed)))).toEqual([]);
});

test('one who leaves ten points more is below, by about ten points, and his vacuum is shallower', () => {
  const results = judged(crewOf(crewWith({ id: 'Cleo', leaves: 0.1 }), 21));
  expect(below(results)).toEqual(['Cleo']);
  const cleo = results.get('Cleo');
  expect(cleo).toMatchObject({ restsOn: 'usual pull', look: true, method: 'short units excused' });
  // A fifth of the units holds half of its charge, so ten points of a full one are nine of the average one.
  expect(cleo?.effect?.low).toBeLessThan(-9);
  expect(cleo?.effect?.high).toBeGreaterThan(-10);
  expect(cleo?.effect?.high).toBeLessThan(0);
  expect(cleo?.shallowerKpa?.low).toBeGreaterThan(0);
  expect(cleo?.adjustedP).toBeLessThan(0.001);
});

test('one who stops every fifth pull is below, and the verdict rests on the stops', () => {
  const results = judged(crewOf(crewWith({ id: 'Dan', stops: 0.2 }), 22));
  expect(below(results)).toEqual(['Dan']);
  const dan = results.get('Dan');
  expect(dan?.restsOn).toBe('early stops');
  expect(dan?.earlyStops?.share).toBeGreaterThan(0.1);
  expect(dan?.earlyStops?.usualShare).toBeLessThan(0.05);
  expect(dan?.effect?.value).toBeLessThan(0);
});

test('the leak specialist and the one who does all the large plant are not blamed for it', () => {
  const crew = crewWith({ id: 'Ben', leaks: 0.9 }, { id: 'Eve', category: 'industrial_process' });
  for (let seed = 31; seed <= 34; seed++) {
    const results = judged(crewOf(crew, seed));
    expect(below(results)).toEqual([]);
    // Nobody else does what Eve does: nothing is said of her.
    expect(results.get('Eve')).toMatchObject({ verdict: 'too few', effect: null, weakShare: 1 });
  }
});

test('units that are known to have come short count for nobody', () => {
  const crew = crewOf(alike, 41);
  const decided = crew.map(
    (job): ComparedRecovery =>
      job.technicianId === 'Ada' && job.jobType === 'repair'
        ? { ...job, recoveredMassKg: 0, decided: 'short on arrival' }
        : job,
  );
  const ada = judged(decided).get('Ada');
  expect(ada?.verdict).toBe('within');
  expect(ada?.leftOut.shortOnArrival).toBe(decided.filter((job) => job.decided !== null).length);
});

test('under twenty jobs nothing is said, and a newcomer’s first forty are not counted', () => {
  const results = judged(
    crewOf(crewWith({ id: 'Ada', jobs: 19, leaves: 0.4 }, { id: 'Gus', jobs: 59, begins: 200, leaves: 0.4 }), 51),
  );
  for (const id of ['Ada', 'Gus'])
    expect(results.get(id)).toMatchObject({ verdict: 'too few', effect: null, p: null, look: false });
  expect(results.get('Gus')).toMatchObject({ judgedJobs: 19, leftOut: { firstJobs: 40 } });
});

test('jobs done before the first of the records are told, and then nobody is new', () => {
  const crew = crewOf(crewWith({ id: 'Gus', jobs: 59, begins: 200 }), 52);
  const earlierJobs = new Map([['Gus', 100]]);
  const gus = compareTechnicians(crew, { earlierJobs }).technicians.find(({ technicianId }) => technicianId === 'Gus');
  expect(gus).toMatchObject({ judgedJobs: 59, leftOut: { firstJobs: 0 } });
});

test('in a crew of four nobody is below, but a look is asked for', () => {
  const results = judged(crewOf([{ id: 'Ada', leaves: 0.15 }, ...alike.slice(1, 4)], 61));
  expect(results.get('Ada')).toMatchObject({ verdict: 'within', look: true });
  expect(below(results)).toEqual([]);
});

test('in a crew of five who differ widely, the one far below is', () => {
  expect(below(judged(crewOf([{ id: 'Ada', leaves: 0.2 }, ...alike.slice(1, 5)], 62)))).toEqual(['Ada']);
});

test('without vacuums all jobs count as they are, and one far below is still found', () => {
  const blind = crewOf(crewWith({ id: 'Cleo', leaves: 0.15 }), 71).map((job) => ({ ...job, finalVacuumKpaAbs: null }));
  const results = judged(blind);
  expect(below(results)).toEqual(['Cleo']);
  expect(results.get('Cleo')).toMatchObject({ method: 'all jobs', shallowerKpa: null, earlyStops: null });
});

test('a vacuum that everybody writes down alike tells nothing', () => {
  const alikeVacuum = crewOf(alike, 72).map((job) => ({ ...job, finalVacuumKpaAbs: 67 }));
  for (const { method, verdict } of judged(alikeVacuum).values()) {
    expect(method).toBe('all jobs');
    expect(verdict).toBe('within');
  }
});

test('no record, one technician, or equal jobs: nothing is said, and nothing breaks', () => {
  expect(compareTechnicians([])).toMatchObject({ technicians: [], crew: { judged: 0, centre: null } });
  const [alone] = compareTechnicians(crewOf([{ id: 'Ada' }], 81)).technicians;
  expect(alone).toMatchObject({ verdict: 'too few', effect: null, recoveries: 150 });
  const equal = crewOf(alike, 82).map((job) => ({
    ...job,
    jobType: 'service',
    recoveredMassKg: 4.5,
    finalVacuumKpaAbs: 67,
  }));
  for (const { verdict, effect } of judged(equal).values()) {
    expect(verdict).toBe('within');
    expect(effect?.value).toBeCloseTo(0, 9);
  }
});

test('observed mass is what was recovered, expected mass what colleagues would have', () => {
  const crew = crewOf(crewWith({ id: 'Cleo', leaves: 0.1 }), 91);
  const own = crew.filter(({ technicianId }) => technicianId === 'Cleo');
  const cleo = judged(crew).get('Cleo');
  expect(cleo?.recoveries).toBe(own.length);
  expect(cleo?.observedMassKg).toBeCloseTo(
    own.reduce((sum, job) => sum + job.recoveredMassKg, 0),
    9,
  );
  expect((cleo?.observedMassKg ?? 0) / (cleo?.expectedMassKg ?? 1)).toBeGreaterThan(0.84);
  expect((cleo?.observedMassKg ?? 0) / (cleo?.expectedMassKg ?? 1)).toBeLessThan(0.93);
});
