import { expect, test } from 'vitest';
import { inHg, judged, lb, usualWork } from '../../support/judged-records';
import { flag, flagsOf, rulesOf } from './judge';

test('a sound pull has no flags', () => {
  expect(flagsOf(judged())).toEqual([]);
});

test('low and shallow: the job may have stopped early, by the numbers it says', () => {
  const flags = flagsOf(judged({ recoveredMassKg: lb(3.6), finalVacuumKpaAbs: inHg(5) }));
  const { certainty, evidence, expectedMassKg } = flag(flags, 'stopped_early');
  expect(certainty).toBeGreaterThan(0.8);
  expect(evidence.peers).toMatchObject({ alike: 'category and job type', fromYear: 2023, toYear: 2025 });
  // By arithmetic: sound pulls of the usual work give 88 to 98 per cent.
  expect(evidence.peers?.median).toBeGreaterThan(0.88);
  expect(expectedMassKg).toBeCloseTo((evidence.peers?.median ?? 0) * lb(8), 9);
  expect(evidence.vacuum?.kpaAbs).toBeCloseTo(inHg(5), 9);
  expect(rulesOf(flags)).not.toContain('short_on_arrival');
});

test('low with the usual vacuum: the unit came short, and one in ten is left to what records cannot tell', () => {
  const flags = flagsOf(judged({ recoveredMassKg: lb(3.6), finalVacuumKpaAbs: inHg(10.4) }));
  const { certainty } = flag(flags, 'short_on_arrival');
  expect(certainty).toBeGreaterThan(0.6);
  expect(certainty).toBeLessThanOrEqual(0.9);
  expect(rulesOf(flags)).not.toContain('stopped_early');
});

test('low without a vacuum: unusual, and not very sure of a fault', () => {
  const flags = flagsOf(judged({ recoveredMassKg: lb(3.6), finalVacuumKpaAbs: null }));
  expect(rulesOf(flags)).toEqual(['low_unexplained']);
  expect(flag(flags, 'low_unexplained').certainty).toBeLessThan(0.4);
});

test('somebody who always gets less is no one who stops early', () => {
  const usual = usualWork().map((record) =>
    record.technicianId === 'Avery' && record.recoveredMassKg > 0.8 * record.fullChargeKg
      ? { ...record, recoveredMassKg: lb(Math.round((record.recoveredMassKg / lb(1)) * 8.2) / 10) }
      : record,
  );
  const pull = { recoveredMassKg: lb(5.4), finalVacuumKpaAbs: inHg(8) };
  expect(rulesOf(flagsOf(judged(pull), [], [], usual))).not.toContain('stopped_early');
});

test('somebody who is sent to all leaks is no one who stops early', () => {
  const usual = usualWork().map((record) =>
    record.recoveredMassKg < 0.8 * record.fullChargeKg ? { ...record, technicianId: 'Avery' } : record,
  );
  const flags = flagsOf(judged({ recoveredMassKg: lb(3.6), finalVacuumKpaAbs: inHg(10.4) }), [], [], usual);
  expect(rulesOf(flags)).not.toContain('stopped_early');
});

test('too few like jobs: nothing is called low', () => {
  const usual = usualWork().slice(0, 15);
  const flags = flagsOf(judged({ recoveredMassKg: lb(3.6), finalVacuumKpaAbs: null }), [], [], usual);
  expect(flags).toEqual([]);
});

test('a scale too coarse for the charge says nothing about a low yield', () => {
  const tiny = judged({ nameplateChargeKg: lb(0.4), recoveredMassKg: lb(0.1), finalVacuumKpaAbs: null });
  expect(rulesOf(flagsOf(tiny))).not.toContain('low_unexplained');
});
