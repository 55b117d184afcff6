import { expect, test } from 'vitest';
import { compareTechnicians } from '@/analytics/technician-comparison/compare-technicians';
import { explainVerdict } from '@/analytics/technician-comparison/explain-verdict';
import { plainCharacters } from '@/lib/format';
import { crewOf, crewWith, type Person } from './crew';

const said = (person: Person, seed: number): string => {
  const own = compareTechnicians(crewOf(crewWith(person), seed)).technicians.find(
    ({ technicianId }) => technicianId === person.id,
  );
  return own ? plainCharacters(explainVerdict(person.id, own)) : '';
};

test('below says by how much, with range, jobs, vacuum and luck', () => {
  expect(said({ id: 'Cleo', leaves: 0.1 }, 21)).toMatch(
    /^After allowing for the kind of jobs, Cleo recovers \d+\.\d points less of nameplate than colleagues would have \(likely range \d+\.\d to \d+\.\d, 150 jobs\), and the final vacuum is shallower too, by \d\.\d inHg: under 1 in 1,000 by luck\.$/,
  );
});

test('below for early stops begins with the stops', () => {
  expect(said({ id: 'Dan', stops: 0.2 }, 22)).toMatch(
    /^About \d+ of \d+ pulls on units that had not come short look stopped early: \d+%, where \d% is usual \(under 1 in 1,000 by luck\)\. After allowing/,
  );
});

test('a scale in doubt is told as one', () => {
  expect(said({ id: 'Hal', scale: { job: 90, low: 0.08 } }, 3)).toMatch(
    /within what sound technicians differ by\. Since \w+ \d+, 2024 the scale of Hal seems to read about \d+% low \(likely range \d+% to \d+%\): all pulls came out lower, the final vacuum did not\. Have the scale checked\. Those \d+ jobs are set aside here\.$/,
  );
});

test('too few says how many', () => {
  expect(said({ id: 'Ada', jobs: 12 }, 5)).toBe('Not judged: 12 jobs to judge by, and nothing is said below 20.');
});

test('no sentence uses the words that mislead', () => {
  const all = compareTechnicians(
    crewOf(crewWith({ id: 'Dan', stops: 0.2 }, { id: 'Cleo', leaves: 0.1 }), 23),
  ).technicians;
  for (const own of all)
    expect(explainVerdict(own.technicianId, own)).not.toMatch(/significan|confidence|outlier|\bscore|\brank/i);
});
