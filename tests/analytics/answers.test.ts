import { expect, test } from 'vitest';
import { lowAgainNote, mostLowFirst } from '@/analytics/appliances/low-again';
import { piecesText } from '@/analytics/figures/pieces';
import { borneOutNote, flagsAnswer, formatCertainty, lessSureNote } from '@/analytics/flags/sentence';
import { groupAnswer, groupsOfHalf, spreadNote } from '@/analytics/group-sentence';

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

test('flags in words', () => {
  const answer = (flagged: number, records = flagged) => plainSpaces(piecesText(flagsAnswer({ flagged, records })));
  expect(answer(12)).toBe('12 records need a look.');
  expect(answer(1)).toBe('1 record needs a look.');
  expect(answer(0)).toBe('No record here needs a look.');
  expect(answer(0, 3)).toBe('No record here is more likely wrong than right.');
  expect(plainSpaces(lessSureNote({ flags: 9, flagged: 2, records: 3, byRule: [] }))).toBe(
    '1 other record may only have come short, or is less sure.',
  );
  expect(lessSureNote({ flags: 2, flagged: 2, records: 2, byRule: [] })).toBe('');
});

test('how often flags were borne out is said with its range, and nothing before the first', () => {
  // Wilson, 31 of 50: 0.4815 to 0.7414 (statistics handbooks print 0.48 to 0.74).
  expect(plainSpaces(borneOutNote({ decided: 50, confirmed: 31, low: 0.4815, high: 0.7414 }))).toBe(
    'Of the last 50 decided flags, 31 were borne out (likely range 48% to 74%).',
  );
  expect(borneOutNote({ decided: 0, confirmed: 0, low: null, high: null })).toBe('');
});

test('no certainty is read as quite sure', () => {
  expect(formatCertainty(1)).toBe('over 99%');
  expect(formatCertainty(0.8)).toBe('80%');
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
