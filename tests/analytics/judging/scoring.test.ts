import { expect, test } from 'vitest';
import type { SimulatedTruth } from '@/seed/simulation/truth';
import { disagreement } from '../../bench/detection/agreement';
import { calibration, earlyStops, entrySlips, type JudgedCompany, surestTrue } from '../../bench/detection/score';
import { plantedFaults, type ScoredFlag } from '../../bench/detection/truth-of-flags';
import { crewFigures } from '../../bench/technicians/figures';

// Worked by hand: rows 1 and 2 were stopped early, 3 to 5 are slips of the pen, 6 came short, 7 and 8 are sound.
const planted = plantedFaults({
  bad_records: [
    { row: 1, kinds: ['stopped_early'] },
    { row: 2, kinds: ['stopped_early'] },
    { row: 3, kinds: ['decimal_low'] },
    { row: 4, kinds: ['swapped_weights'] },
    { row: 5, kinds: ['zero_recovered'] },
  ],
  naturally_low_rows: [6],
});
const flag = (recordId: string, rule: ScoredFlag['rule'], certainty: number, recoveredMassKg = 1): ScoredFlag => ({
  recordId,
  rule,
  certainty,
  recoveredMassKg,
});
const company: JudgedCompany = {
  planted,
  refused: [4],
  flags: [
    flag('3', 'unit_slip', 0.97),
    flag('1', 'stopped_early', 0.95),
    flag('6', 'short_on_arrival', 0.91),
    flag('5', 'low_unexplained', 0.9, 0),
    flag('2', 'short_on_arrival', 0.71),
    flag('8', 'nameplate_doubtful', 0.48),
    flag('7', 'stopped_early', 0.42),
  ],
};

test('early stops count as found by their own rule only', () => {
  expect(earlyStops([company])).toEqual({ precision: { of: 2, hits: 1 }, recall: { of: 2, hits: 1 } });
});

test('a refused row and a flagged mass of nothing are found slips, a doubted sound nameplate is a false one', () => {
  expect(entrySlips([company])).toEqual({ precision: { of: 4, hits: 3 }, recall: { of: 3, hits: 3 } });
  expect(entrySlips([company], 'swapped_weights').recall).toEqual({ of: 1, hits: 1 });
});

test('the surest flags are true only in the way they say', () => {
  expect(surestTrue([company], 4)).toEqual([4]);
  expect(surestTrue([company], 5)).toEqual([4]);
});

test('bins of certainty hold their mean and the share that is true', () => {
  const [low, middle, high] = calibration([company], null);
  expect(low).toEqual({ from: 0.4, flags: 2, certainty: expect.closeTo(0.45), trueShare: 0 });
  expect(middle).toMatchObject({ from: 0.7, flags: 1, trueShare: 0 });
  expect(high).toMatchObject({ from: 0.9, flags: 4, trueShare: 1 });
});

test('whoever is called below without being planted as poor is accused wrongly', () => {
  const person = (name: string, of: SimulatedTruth['technicians'][number]['class'], points: number) => ({
    name,
    class: of,
    skill_logit: 0,
    learning: null,
    stops_early_rate: 0,
    first_month: '2015-01',
    last_month: '2026-11',
    records: 100,
    true_yield_points: points,
  });
  const called = (name: string, verdict: 'below' | 'within') => ({
    name,
    verdict,
    look: verdict === 'below',
    hasScale: false,
    range: { low: -13, high: -9 },
  });
  const { accused, classes } = crewFigures([
    {
      planted: [person('Ann', 'bad_low_skill', -10), person('Bo', 'ordinary', 0), person('Cy', 'ordinary', 0)],
      called: [called('Ann', 'below'), called('Bo', 'below'), called('Cy', 'within')],
    },
  ]);
  expect(accused).toMatchObject({ sound: 2, wrongly: 1, whereNobodyIsPoor: 0, perCrewAndYear: 1 / 12 });
  expect(classes).toMatchObject({
    bad_low_skill: { technicians: 1, below: 1, covered: 1 },
    ordinary: { technicians: 2, below: 1, covered: 0 },
  });
});

test('a flag that only one way raises is a disagreement, as is another certainty', () => {
  const called = [{ name: 'Ann', verdict: 'below' as const, look: true, hasScale: false, range: null }];
  const otherwise = {
    ...company,
    refused: [],
    flags: [flag('1', 'stopped_early', 0.9), flag('2', 'stopped_early', 0.5)],
    called: called.map((own) => ({ ...own, verdict: 'within' as const })),
  };
  expect(disagreement([{ imported: otherwise, pure: { ...company, called } }])).toEqual({
    flagsOnlyImported: 1,
    flagsOnlyFromFile: 6,
    companiesRefusingOtherwise: 1,
    techniciansCalledOtherwise: 1,
    largestDifferenceOfCertainty: 0.05,
  });
});
