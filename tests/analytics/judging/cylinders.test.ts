import { expect, test } from 'vitest';
import { judged, lb } from '../../support/judged-records';
import { flag, flagsOf, rulesOf } from './judge';

const later = (changes: Parameters<typeof judged>[0]) =>
  judged({
    id: 'later',
    recordRef: 'X-2',
    recoveredOn: '2025-06-14',
    recoveredAt: '2025-06-14T09:00:00-04:00',
    applianceId: 'Mill Street/RTU-2',
    cylinderId: 'own',
    ...changes,
  });
const into = { cylinderId: 'own', startWeightKg: lb(17.5) };

test('nothing written, yet the cylinder is found heavier: the ticket is doubtful', () => {
  const record = judged({ ...into, endWeightKg: lb(17.5), recoveredMassKg: 0 });
  const next = later({ startWeightKg: lb(24.9), endWeightKg: lb(32.4) });
  const { certainty, evidence } = flag(flagsOf(record, [next]), 'cylinder_chain');
  expect(certainty).toBeGreaterThan(0.9);
  expect(evidence.nextRef).toBe('X-2');
  expect(evidence.wentInKg).toBeCloseTo(lb(7.4), 6);
});

test('nothing written and nothing found: the unit was empty', () => {
  const record = judged({ ...into, endWeightKg: lb(17.5), recoveredMassKg: 0 });
  const next = later({ startWeightKg: lb(17.5), endWeightKg: lb(25) });
  expect(rulesOf(flagsOf(record, [next]))).not.toContain('cylinder_chain');
});

test('tickets of one month may stand in another order than the weights', () => {
  const record = judged({ ...into, startWeightKg: lb(25), endWeightKg: lb(32.5) });
  const earlier = later({ startWeightKg: lb(17.5), endWeightKg: lb(25) });
  expect(flagsOf(record, [earlier])).toEqual([]);
});

const cylinder = { id: 'own', refrigerant: 'R-410A', tareWeightKg: lb(17.5), fillLimitKg: lb(22) };

test('beyond the fill limit, as surely as the weight was written as it was', () => {
  const record = judged({ ...into, startWeightKg: lb(33), endWeightKg: lb(40.5) });
  const { certainty, evidence } = flag(flagsOf(record, [], [cylinder]), 'cylinder_overfilled');
  expect(certainty).toBeGreaterThan(0.9);
  expect(evidence.netKg).toBeCloseTo(lb(23), 6);
  const atLimit = judged({ ...into, startWeightKg: lb(32), endWeightKg: lb(39.5) });
  expect(rulesOf(flagsOf(atLimit, [], [cylinder]))).toEqual([]);
});

test('another refrigerant than the cylinder is marked for', () => {
  const record = judged({ ...into, endWeightKg: lb(25), refrigerant: 'R-22' });
  const { certainty, evidence } = flag(flagsOf(record, [], [cylinder]), 'wrong_cylinder');
  expect(certainty).toBe(0.9);
  expect(evidence).toEqual({ refrigerant: 'R-22', cylinderRefrigerant: 'R-410A', otherPulls: 0 });
});

test('another refrigerant than all tickets around it; one single other ticket says too little', () => {
  const record = judged({ ...into, startWeightKg: lb(25), endWeightKg: lb(32.5), refrigerant: 'R-22' });
  const before = later({
    id: 'before',
    recoveredOn: '2025-06-02',
    recoveredAt: null,
    startWeightKg: lb(17.5),
    endWeightKg: lb(25),
  });
  const after = later({ startWeightKg: lb(32.5), endWeightKg: lb(38) });
  const { certainty, evidence } = flag(flagsOf(record, [before, after]), 'wrong_cylinder');
  expect(evidence).toMatchObject({ cylinderRefrigerant: 'R-410A', otherPulls: 2 });
  expect(certainty).toBeCloseTo(2 / 3, 9);
  expect(rulesOf(flagsOf(record, [before]))).not.toContain('wrong_cylinder');
  expect(rulesOf(flagsOf(after, [before, record]))).not.toContain('wrong_cylinder');
});
