import { expect, test } from 'vitest';
import { coachingChange } from '@/analytics/technician-comparison/coaching-change';
import { dayNumber } from '@/analytics/technician-comparison/columns';
import { compareTechnician, compareTechnicians } from '@/analytics/technician-comparison/compare-technicians';
import { levelStep } from '@/analytics/technician-comparison/level-step';
import { given } from '../statistics/given';
import { normals } from '../statistics/random';
import { crewOf, crewWith, type Person } from './crew';

const resultOf = (person: Person, seed: number) =>
  compareTechnicians(crewOf(crewWith(person), seed)).technicians.find(({ technicianId }) => technicianId === person.id);

test('a scale that begins to read 8 % low is called a scale, and its months are set aside', () => {
  const hal = resultOf({ id: 'Hal', scale: { job: 90, low: 0.08 } }, 3);
  expect(hal).toMatchObject({ verdict: 'within', look: true, workChange: null });
  expect(hal?.scale?.readsLow.low).toBeLessThan(0.08);
  expect(hal?.scale?.readsLow.high).toBeGreaterThan(0.08);
  // The 90th of 150 jobs over a thousand days came on day 600.
  const off = dayNumber(hal?.scale?.from ?? '') - (dayNumber('2023-01-02') + 600);
  expect(Math.abs(off)).toBeLessThan(45);
  expect(hal?.scale?.to).toBeNull();
  expect(hal?.leftOut.scaleInDoubt).toBe(hal?.scale?.jobs);
  // Without those months he is as good as the others.
  expect(hal?.effect?.low).toBeLessThan(0);
  expect(hal?.effect?.high).toBeGreaterThan(0);
});

test('one whose work gets worse is not taken for a scale', () => {
  const called = [1, 2, 3, 4, 5, 6].map((seed) => resultOf({ id: 'Hal', worse: { job: 75, leaves: 0.12 } }, seed));
  expect(called.filter((own) => own?.scale)).toEqual([]);
  expect(called.filter((own) => own?.workChange?.of === 'full pulls' && !own.workChange.better).length).toBeGreaterThan(
    3,
  );
});

test('one who was coached out of stopping early is judged by what came after', () => {
  const dan = resultOf({ id: 'Dan', jobs: 240, stops: 0.35, stopsFrom: { job: 120, stops: 0.005 } }, 8);
  expect(dan?.workChange).toMatchObject({ of: 'early stops', better: true });
  expect(dan?.verdict).toBe('within');
  expect(dan?.leftOut.beforeChange).toBeGreaterThan(80);
  expect(dan?.judgedFrom).toBe(dan?.workChange?.from);
});

test('what came of a coaching is told with a range that bears looking often', () => {
  const person = { id: 'Dan', jobs: 240, leaves: 0.12, worse: { job: 120, leaves: -0.12 } };
  const { course: coached } = compareTechnician(crewOf(crewWith(person), 9), 'Dan', ['2024-05-16', '2023-01-03']);
  const change = coached?.coaching[0]?.change;
  expect(change?.found).toBe('better');
  expect(change?.low).toBeLessThan(0.12);
  expect(change?.high).toBeGreaterThan(0.1);
  expect(change?.p).toBeLessThan(0.01);
  // Nothing to compare with before the second day of the book.
  expect(coached?.coaching[1]).toEqual({ startedOn: '2023-01-03', change: null });
  expect(coached?.months.length).toBeGreaterThan(30);
});

test('looked at after every job, a coaching that changed nothing is called a change in at most one of twenty', () => {
  const luck = normals(77);
  const crews = 300;
  const days = Array.from({ length: 120 }, (_, at) => at);
  const called = Array.from({ length: crews }, () => {
    const differences = days.map(() => 0.06 * luck());
    const series = { days, differences, weights: days.map(() => 1), first: days.map(() => 0), variance: 0.06 ** 2 };
    return given(coachingChange(series, 60)).found !== 'no clear change';
  }).filter(Boolean).length;
  expect(called / crews).toBeLessThanOrEqual(0.05);
});

test('steps are found where none is in about as many sequences as their chances say', () => {
  const luck = normals(78);
  const sequences = 400;
  const chances = Array.from({ length: sequences }, () => {
    const values = Array.from({ length: 150 }, luck);
    return levelStep({ values, weights: values.map(() => 1) }, 1)?.p ?? 1;
  });
  const share = chances.filter((p) => p <= 0.1).length / sequences;
  // The approximation of James, James & Siegmund (1987) is a little on the safe side; four standard errors about 0.1.
  expect(share).toBeGreaterThan(0.03);
  expect(share).toBeLessThan(0.16);
});
