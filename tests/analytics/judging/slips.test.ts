import { expect, test } from 'vitest';
import { judged, lb } from '../../support/judged-records';
import { flag, flagsOf, rulesOf } from './judge';

/** A pull into a cylinder of its own, of which the next ticket tells what truly went in. */
const chained = (written: number, truly: number) => ({
  record: judged({
    cylinderId: 'own',
    startWeightKg: lb(17.5),
    endWeightKg: lb(17.5 + written),
    recoveredMassKg: lb(written),
  }),
  next: judged({
    id: 'next',
    recordRef: 'X-2',
    recoveredOn: '2025-06-20',
    recoveredAt: '2025-06-20T09:00:00-04:00',
    applianceId: 'Mill Street/RTU-2',
    cylinderId: 'own',
    startWeightKg: lb(17.5 + truly),
    endWeightKg: lb(17.5 + truly + 7.5),
  }),
});

test.each([
  // 7.5 lb is 3.40 kg: 1 lb = 0.45359237 kg exactly, NIST Handbook 44 appendix C.
  ['kg_as_lb', 3.4, 7.5],
  ['mass_tenth', 0.75, 7.5],
  ['mass_tenfold', 75, 7.5],
  // 7.5 lb is 120 oz.
  ['oz_as_lb', 120, 7.5],
] as const)('%s is told by the scale’s steps and the next weighing', (meaning, written, truly) => {
  const { record, next } = chained(written, truly);
  const { certainty, evidence, expectedMassKg } = flag(flagsOf(record, [next]), 'unit_slip');
  expect(certainty).toBeGreaterThan(0.95);
  expect(evidence.meaning).toBe(meaning);
  expect((expectedMassKg ?? 0) / lb(1)).toBeCloseTo(truly, 1);
  expect(evidence.nextWeighing?.recordRef).toBe('X-2');
});

test('the same figure with weights that follow is a low pull and no slip', () => {
  const { record, next } = chained(3.4, 3.4);
  expect(rulesOf(flagsOf(record, [next]))).not.toContain('unit_slip');
});

test('more than a unit holds is flagged, whatever the slip was', () => {
  const { evidence, certainty } = flag(flagsOf(judged({ recoveredMassKg: lb(13.7) })), 'over_full_charge');
  expect(certainty).toBeGreaterThan(0.9);
  expect(evidence).toEqual({ recoveredMassKg: lb(13.7), fullChargeKg: lb(8) });
});

test('a usual overcharge is not', () => {
  expect(rulesOf(flagsOf(judged({ recoveredMassKg: lb(8.6) })))).not.toContain('over_full_charge');
});

test('a nameplate ten times that of other visits is doubtful; theirs are not', () => {
  const visit = judged({ id: 'before', recordRef: 'X-0', recoveredOn: '2024-05-02', recoveredAt: null });
  const record = judged({ nameplateChargeKg: lb(80) });
  const { certainty, evidence } = flag(flagsOf(record, [visit]), 'nameplate_doubtful');
  expect(certainty).toBeGreaterThan(0.95);
  expect(evidence.meaning).toBe('plate_tenfold');
  expect(evidence.meantChargeKg / lb(1)).toBeCloseTo(8, 6);
  expect(evidence.otherVisits).toEqual([{ recordRef: 'X-0', nameplateChargeKg: lb(8) }]);
  expect(rulesOf(flagsOf(visit, [record]))).not.toContain('nameplate_doubtful');
});

test('digits changed over are told by a yield that no unit gives', () => {
  // 12.5 lb out of a unit of 13.2 lb, its plate written as 31.2: against 40 per cent of a charge nobody here has.
  const record = judged({ nameplateChargeKg: lb(21), recoveredMassKg: lb(11.5) });
  expect(flag(flagsOf(record), 'nameplate_doubtful').evidence.meaning).toBe('plate_digits');
});

test('the later of two like tickets is the doubled one', () => {
  const first = judged({ id: 'first', recordRef: 'X-9' });
  const second = judged({ recordRef: 'X-10' });
  const { certainty, evidence } = flag(flagsOf(second, [first]), 'duplicate');
  expect(certainty).toBeGreaterThanOrEqual(0.97);
  expect(evidence.ofRef).toBe('X-9');
  expect(rulesOf(flagsOf(first, [second]))).not.toContain('duplicate');
});

test('two pulls out of one unit on one day are no doubled ticket', () => {
  const other = judged({ id: 'first', recordRef: 'X-0', recoveredMassKg: lb(2.1) });
  expect(rulesOf(flagsOf(judged({ recoveredMassKg: lb(5.4) }), [other]))).not.toContain('duplicate');
});

test.each([
  ['disagree with the mass', { startWeightKg: lb(20), endWeightKg: lb(27.5), recoveredMassKg: lb(5.7) }, lb(7.5)],
  ['are changed over', { startWeightKg: lb(27.5), endWeightKg: lb(20), recoveredMassKg: lb(7.5) }, null],
])('weights that %s', (_, weights, expected) => {
  const { expectedMassKg } = flag(flagsOf(judged(weights)), 'weights_disagree');
  if (expected === null) expect(expectedMassKg).toBeNull();
  else expect(expectedMassKg).toBeCloseTo(expected, 6);
});

test('weights within what two readings explain agree', () => {
  const weights = { startWeightKg: lb(20), endWeightKg: lb(27.6), recoveredMassKg: lb(7.5) };
  expect(rulesOf(flagsOf(judged(weights)))).not.toContain('weights_disagree');
});
