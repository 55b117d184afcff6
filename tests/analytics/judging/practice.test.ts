import { expect, test } from 'vitest';
import { inHg, judged, usualWork } from '../../support/judged-records';
import { flag, flagsOf, rulesOf } from './judge';

test('a level that like pulls reach and this one misses by far', () => {
  // 40 CFR 82.156 Table 1 asks 10 inHg of high pressure appliances from 200 lb on.
  const usual = usualWork({ requiredLevelKpaAbs: inHg(7) });
  const missed = judged({ requiredLevelKpaAbs: inHg(7), finalVacuumKpaAbs: inHg(4) });
  const { certainty, evidence } = flag(flagsOf(missed, [], [], usual), 'level_not_reached');
  expect(certainty).toBeGreaterThan(0.7);
  expect(certainty).toBeLessThanOrEqual(0.8);
  expect(evidence.reachedShare).toBeCloseTo(1, 2);
  const read = judged({ requiredLevelKpaAbs: inHg(7), finalVacuumKpaAbs: inHg(6.98) });
  expect(rulesOf(flagsOf(read, [], [], usual))).not.toContain('level_not_reached');
});

test('where like pulls usually miss the level, a single one says nothing', () => {
  const usual = usualWork({ requiredLevelKpaAbs: inHg(10) });
  const missed = judged({ requiredLevelKpaAbs: inHg(10), finalVacuumKpaAbs: inHg(8.5) });
  expect(rulesOf(flagsOf(missed, [], [], usual))).not.toContain('level_not_reached');
});

test('a hold that is missing where tickets state one, surer when it is written down as none', () => {
  const usual = usualWork({ holdMinutes: 10 });
  const unstated = flag(flagsOf(judged(), [], [], usual), 'hold_missing');
  const none = flag(flagsOf(judged({ holdMinutes: 0 }), [], [], usual), 'hold_missing');
  expect(none.certainty).toBeGreaterThan(unstated.certainty);
  expect(unstated.certainty).toBeLessThan(0.5);
  expect(rulesOf(flagsOf(judged({ holdMinutes: 5 }), [], [], usual))).toEqual([]);
});

test('a company that never states a hold is not told so record by record', () => {
  expect(rulesOf(flagsOf(judged()))).not.toContain('hold_missing');
});

test('a date after today', () => {
  const { evidence, certainty } = flag(flagsOf(judged({ recoveredOn: '2027-01-04' })), 'date_doubtful');
  expect(certainty).toBeGreaterThan(0.95);
  expect(evidence.today).toBe('2026-12-01');
});

test('a date a year away from the tickets numbered around it', () => {
  // Ticket T-1161 of the usual work is of 10 June 2024.
  const wrong = judged({ recordRef: 'T-1161', recoveredOn: '2025-06-10' });
  const { certainty, evidence } = flag(flagsOf(wrong), 'date_doubtful');
  expect(certainty).toBe(0.9);
  expect(evidence.from?.slice(0, 7)).toBe('2024-06');
  expect(rulesOf(flagsOf(judged({ recordRef: 'T-1161', recoveredOn: '2024-06-11' })))).not.toContain('date_doubtful');
});
