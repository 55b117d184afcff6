import { expect, test } from 'vitest';
import { judgedRecordsOf } from '@/seed/simulation/judged-records';
import type { SimulatedFault } from '@/seed/simulation/options';
import { simulateCompany } from '@/seed/simulation/simulate-company';

const { file, truth } = simulateCompany('of the test', { size: 2_500, slipShare: 0.03 });
const lines = file.trim().split('\n');
const rowsWith = (...kinds: SimulatedFault[]) =>
  truth.bad_records.filter((record) => record.kinds.some((kind) => kinds.includes(kind))).map(({ row }) => row);

test('the same seed gives the same company, another one another', () => {
  expect(simulateCompany('of the test', { size: 2_500, slipShare: 0.03 })).toEqual({ file, truth });
  expect(simulateCompany('another', { size: 2_500 }).file).not.toBe(file);
});

test('a company is about as large as asked, and its rows are those of its people', () => {
  expect(lines.length - 1).toBeGreaterThan(2_500 * 0.8);
  expect(lines.length - 1).toBeLessThan(2_500 * 1.2);
  const doubled = rowsWith('duplicate').length;
  expect(truth.technicians.reduce((sum, { records }) => sum + records, 0)).toBe(lines.length - 1 - doubled);
});

test('every class of person is planted, and none where none is asked for', () => {
  expect(new Set(truth.technicians.map((technician) => technician.class)).size).toBe(6);
  expect(truth.planted_bad_technicians).toHaveLength(2);
  const honest = simulateCompany('of the test', { size: 600, plantsPeople: false }).truth;
  expect(honest.planted_bad_technicians).toEqual([]);
  expect(honest.planted_drifting_scale).toEqual([]);
});

test('a doubled row says what the row before it says, under another number', () => {
  const doubled = rowsWith('duplicate');
  expect(doubled.length).toBeGreaterThan(0);
  for (const row of doubled) expect(lines[row]?.slice(9)).toBe(lines[row - 1]?.slice(9));
});

test('an import refuses only rows with slips in them; most others become records', async () => {
  const { records, refused } = await judgedRecordsOf(file);
  expect(records.length + refused.length).toBe(lines.length - 1);
  const slips = new Set(truth.bad_records.map(({ row }) => row));
  expect(refused.filter((row) => !slips.has(row))).toEqual([]);
  expect(refused.length).toBeGreaterThan(10);
  expect(rowsWith('swapped_weights').every((row) => refused.includes(row))).toBe(true);
});
