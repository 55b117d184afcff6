import { expect, test } from 'vitest';
import { explain } from '@/analytics/judging/explain/explain';
import type { LowEvidence, Told } from '@/analytics/judging/judgement';
import { FLAG_RULES } from '@/lib/vocabulary';
import { inHg, lb } from '../../support/judged-records';

const low: LowEvidence = {
  recoveredMassKg: lb(3.6),
  fullChargeKg: lb(8),
  peers: {
    records: 214,
    alike: 'category and job type',
    fromYear: 2023,
    toYear: 2025,
    lowerQuartile: 0.884,
    median: 0.93,
    upperQuartile: 0.962,
    lowerFence: 0.767,
  },
  vacuum: { kpaAbs: inHg(5.2), usualKpaAbs: inHg(10), spreadKpa: 3, z: -5.4 },
};

const CASES: readonly (Told & { says: readonly string[] })[] = [
  {
    rule: 'stopped_early',
    evidence: { ...low, share: 0.02 },
    says: ['3.6 lb of 8.0 lb', '45%', '5.2 inHg', '10.0 inHg', '214, 2023 to 2025', '88% and 96%', '2%'],
  },
  { rule: 'short_on_arrival', evidence: low, says: ['3.6 lb', 'normal vacuum', 'leak note'] },
  {
    rule: 'low_unexplained',
    evidence: { ...low, peers: null, vacuum: null },
    says: ['3.6 lb of 8.0 lb', 'without a final vacuum'],
  },
  {
    rule: 'unit_slip',
    evidence: {
      meaning: 'kg_as_lb',
      recoveredMassKg: lb(3.4),
      meantMassKg: lb(7.5),
      fullChargeKg: lb(8),
      isOffStep: true,
      nextWeighing: { recordRef: 'T-7', startWeightKg: lb(25), endWeightKg: lb(20.9) },
    },
    says: ['kilograms written as pounds', '7.5 lb', 'T-7', '25.0 lb', '20.9 lb', 'between the steps'],
  },
  {
    rule: 'weights_disagree',
    evidence: { startWeightKg: lb(20), endWeightKg: lb(27.5), recoveredMassKg: lb(5.7), weighedKg: lb(7.5) },
    says: ['7.5 lb', '5.7 lb'],
  },
  {
    rule: 'cylinder_chain',
    evidence: {
      endWeightKg: lb(17.5),
      recoveredMassKg: 0,
      nextRef: 'T-8',
      nextStartWeightKg: lb(24.9),
      wentInKg: lb(7.4),
    },
    says: ['T-8', '17.5 lb', '24.9 lb', '7.4 lb'],
  },
  {
    rule: 'over_full_charge',
    evidence: { recoveredMassKg: lb(13.7), fullChargeKg: lb(8) },
    says: ['13.7 lb', '8.0 lb'],
  },
  {
    rule: 'nameplate_doubtful',
    evidence: {
      meaning: 'plate_tenfold',
      nameplateChargeKg: lb(80),
      meantChargeKg: lb(8),
      recoveredMassKg: lb(7.5),
      otherVisits: [{ recordRef: 'T-2', nameplateChargeKg: lb(8) }],
    },
    says: ['80.0 lb', '8.0 lb on ticket T-2', 'decimal point one place too far right'],
  },
  {
    rule: 'duplicate',
    evidence: { ofRef: 'T-9', recoveredOn: '2025-06-10', recoveredMassKg: lb(7.5) },
    says: ['T-9', 'Jun 10, 2025', '7.5 lb'],
  },
  {
    rule: 'level_not_reached',
    // 25 mm Hg absolute: 40 CFR 82.156 Table 1, low pressure appliances.
    evidence: { finalVacuumKpaAbs: inHg(20), requiredLevelKpaAbs: 25 * 0.1333224, reachedShare: 0.9 },
    says: ['20.0 inHg', '25 mm Hg absolute', '40 CFR 82.156', '90%'],
  },
  { rule: 'hold_missing', evidence: { holdMinutes: null, statedShare: 0.95 }, says: ['95%'] },
  {
    rule: 'cylinder_overfilled',
    evidence: { grossKg: lb(40.5), tareKg: lb(17.5), netKg: lb(23), fillLimitKg: lb(22) },
    says: ['23.0 lb', '22.0 lb', 'burst', 'local codes'],
  },
  {
    rule: 'wrong_cylinder',
    evidence: { refrigerant: 'R-22', cylinderRefrigerant: 'R-410A', otherPulls: 2 },
    says: ['R‑22', 'R‑410A', '2 other tickets'],
  },
  {
    rule: 'date_doubtful',
    evidence: { recoveredOn: '2025-06-10', from: '2024-06-08', to: '2024-06-12', today: '2026-12-01' },
    says: ['Jun 10, 2025', 'Jun 8, 2024', 'Jun 12, 2024'],
  },
];

test.each(CASES)('$rule is explained with its numbers', ({ says, ...flag }) => {
  const sentence = explain(flag, 'lb').replaceAll('\u00a0', ' ');
  for (const words of says) expect(sentence).toContain(words);
  expect(sentence).not.toMatch(/NaN|undefined|null/);
});

test('every rule has a case here', () => {
  expect(CASES.map(({ rule }) => rule).sort()).toEqual([...FLAG_RULES].sort());
});

test('kilograms for who reads kilograms', () => {
  const evidence = { recoveredMassKg: 6.2, fullChargeKg: 3.6 };
  expect(explain({ rule: 'over_full_charge', evidence }, 'kg')).toContain('6.2\u00a0kg');
});
