import { expect, test } from 'vitest';
import { simulateCompany } from '@/seed/simulation/simulate-company';
import { judgeFile, sampleCompany } from '../../bench/detection/detection';
import { calibration, earlyStops, entrySlips, ratio, surestTrue } from '../../bench/detection/score';
import { PROOF_SEEDS, TUNING_SEEDS } from '../../bench/detection/seeds';

const { file, truth } = sampleCompany();
const sample = await judgeFile(file, truth);
const proofs = await Promise.all(
  PROOF_SEEDS.slice(0, 2).map((seed) => {
    const company = simulateCompany(seed, { size: 2_500 });
    return judgeFile(company.file, company.truth);
  }),
);

test('companies that prove are none that judging was tuned on', () => {
  expect(PROOF_SEEDS.filter((seed) => TUNING_SEEDS.includes(seed))).toEqual([]);
});

// The floors are what the product promises, not what it reaches.
test.each([
  ['the sample company', [sample]],
  ['simulated companies', proofs],
])('%s: early stops are found, and most of what is called one is one', (_, companies) => {
  const { precision, recall } = earlyStops(companies);
  expect(ratio(precision)).toBeGreaterThan(0.75);
  expect(ratio(recall)).toBeGreaterThan(0.55);
});

test.each([
  ['the sample company', [sample]],
  ['simulated companies', proofs],
])('%s: four in five slips are found or refused, and four in five of what is called one is one', (_, companies) => {
  const { precision, recall } = entrySlips(companies);
  expect(ratio(precision)).toBeGreaterThan(0.8);
  expect(ratio(recall)).toBeGreaterThan(0.8);
});

test('of the fifty surest flags at least forty-five say what is so', () => {
  for (const hits of surestTrue([sample, ...proofs])) expect(hits).toBeGreaterThanOrEqual(45);
});

test('nine in ten of the flags that are nine-tenths sure are true', () => {
  const [surest] = calibration([sample, ...proofs], null).filter(({ from }) => from === 0.9);
  expect(surest?.flags).toBeGreaterThan(100);
  expect(surest?.trueShare).toBeGreaterThan(0.9);
});
