import { expect, test } from 'vitest';
import * as sentences from '@/analytics/leak-suspicion/sentence';
import { plainCharacters } from '@/lib/format';

const { chanceText } = sentences;
/** Without the spaces that hold a figure and its word together. */
const suspicionSentence = (told: sentences.ToldSuspicion) => plainCharacters(sentences.suspicionSentence(told));
const siteSuspicionSentence = (site: Parameters<typeof sentences.siteSuspicionSentence>[0]) =>
  plainCharacters(sentences.siteSuspicionSentence(site));

const told = (visits: number, shortVisits: number, leakSuspicion: number | null) => ({
  ...{ visits, shortVisits, leakSuspicion },
  expectedShort: 1.2,
});

test('a suspicion says what was found, what is usual and how likely a leak is', () => {
  expect(suspicionSentence(told(6, 5, 0.972))).toBe(
    'It came short of charge at 5 of 6 visits, where jobs like these find 1.2 short: it leaks with a probability of 97%.',
  );
  expect(suspicionSentence(told(6, 3, 0.4))).toContain('a leak is possible, with a probability of 40%');
  expect(suspicionSentence(told(9, 2, 0.02))).toContain('a leak is unlikely');
});

test('one short visit and too few visits are no suspicion', () => {
  expect(suspicionSentence(told(5, 1, 0))).toContain('once is no pattern');
  expect(suspicionSentence(told(5, 0, 0))).toContain('with its charge at all 5 visits');
  expect(suspicionSentence(told(2, 2, null))).toContain('Nothing can be said of a leak: 2 visits');
  expect(suspicionSentence(told(1, 1, null))).toContain('1 visit of the last 36 months tells');
  expect(suspicionSentence(told(0, 0, null))).toContain('no visit');
});

test('no probability is promised to be certain', () => {
  expect([chanceText(0.9999), chanceText(1), chanceText(0), chanceText(0.5)]).toEqual([
    'over 99%',
    'over 99%',
    'under 1%',
    '50%',
  ]);
});

test('a site is told against other sites, with chance allowed for', () => {
  const site = { judged: 4, suspected: 3, expected: 0.2, look: true };
  expect(siteSuspicionSentence(site)).toBe(
    '3 of 4 units that can be judged here are suspected to leak; other sites would have 0.2. That is more than chance explains over all sites.',
  );
  expect(siteSuspicionSentence({ ...site, suspected: 1, look: false })).toContain('Chance alone may explain that');
  expect(siteSuspicionSentence({ ...site, suspected: 0, look: false })).toContain('None of the 4 units');
  expect(siteSuspicionSentence(null)).toContain('Nothing can be said');
});
