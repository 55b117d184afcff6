import { expect, test } from 'vitest';
import { lowAgainNote, mostLowFirst } from '@/analytics/appliances/low-again';
import { piecesText } from '@/analytics/figures/pieces';
import { groupAnswer, groupsOfHalf, spreadNote } from '@/analytics/group-sentence';
import { lowAnswer, unjudgedNote } from '@/analytics/low-recoveries/sentence';

const plainSpaces = (text: string) => text.replaceAll('\u00a0', ' ');
const group = (recoveredMass: number, recoveries = 1) => ({ recoveredMass, recoveries });
const words = { one: 'site', many: 'sites', verb: 'gave' };

test('groups come to a sum in words', () => {
  expect(plainSpaces(piecesText(groupAnswer([group(10, 2), group(5, 1)], words, 'kg')))).toBe(
    '2 sites gave 15 kg in 3 recoveries.',
  );
  expect(plainSpaces(piecesText(groupAnswer([group(0.45359237)], words, 'lb')))).toBe(
    '1 site gave 1 lb in 1 recovery.',
  );
});

test('half of the mass is counted from the largest down', () => {
  expect(groupsOfHalf([group(1), group(6), group(3)])).toBe(1);
  expect(groupsOfHalf([group(1), group(1), group(1), group(1)])).toBe(2);
  expect(groupsOfHalf([])).toBe(0);
});

test('a spread is only told where few hold half', () => {
  const uneven = [group(100), ...Array.from({ length: 8 }, () => group(10))];
  expect(spreadNote(uneven, 'sites')).toBe('Half of it comes from 1 of the 9 sites.');
  expect(
    spreadNote(
      Array.from({ length: 9 }, () => group(10)),
      'sites',
    ),
  ).toBe('');
});

test('low recoveries in words', () => {
  const judged = { records: 1204, groups: 9, tooFewLikeJobs: 34, low: 12 };
  expect(plainSpaces(piecesText(lowAnswer(judged)))).toBe('12 of 1,204 recoveries lie far below like jobs.');
  expect(plainSpaces(piecesText(lowAnswer({ ...judged, low: 1 })))).toBe(
    '1 of 1,204 recoveries lies far below like jobs.',
  );
  expect(plainSpaces(piecesText(lowAnswer({ ...judged, low: 0 })))).toBe(
    'None of 1,204 recoveries lies far below like jobs.',
  );
  expect(piecesText(lowAnswer({ ...judged, records: 0, low: 0 }))).toBe('Too few like jobs to say anything.');
  expect(plainSpaces(piecesText(unjudgedNote(judged)))).toBe(
    'About 34 others nothing is said: fewer than 20 jobs are like them.',
  );
  expect(piecesText(unjudgedNote({ ...judged, tooFewLikeJobs: 0 }))).toBe('');
});

test('units that come back low are counted in words, the most often low first', () => {
  const unit = (lowRecoveries: number, recoveredMass = 1) => ({ lowRecoveries, recoveredMass });
  expect(mostLowFirst([unit(0, 5), unit(2, 1), unit(0, 9)])).toEqual([unit(2, 1), unit(0, 9), unit(0, 5)]);
  const note = (...low: number[]) => plainSpaces(lowAgainNote(low.map((count) => unit(count))));
  expect(note(0, 0)).toBe('None of them came back far below like jobs.');
  expect(note(1, 0)).toBe('1 unit came back far below like jobs, once.');
  expect(note(1, 1)).toBe('2 units came back far below like jobs, none of them more than once.');
  expect(note(3, 1)).toBe('2 units came back far below like jobs, 1 of them more than once.');
  expect(note(2, 2)).toBe('2 units came back far below like jobs more than once.');
});
