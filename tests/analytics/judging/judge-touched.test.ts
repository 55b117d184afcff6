import { expect, test } from 'vitest';
import type { Baselines } from '@/analytics/judging/baselines/baselines';
import { judgeRecords, judgeTouched } from '@/analytics/judging/judge-records';
import { judgedRecordsOf } from '@/seed/simulation/judged-records';
import { simulateCompany } from '@/seed/simulation/simulate-company';
import { SETTINGS } from '../../support/judged-records';

const { file } = simulateCompany('of the touched', { size: 1_500, slipShare: 0.03 });
const { records } = await judgedRecordsOf(file, SETTINGS.today);
const { flags, baselines } = judgeRecords(records, [], SETTINGS);

test('judging all again gives the same flags', () => {
  expect(judgeRecords(records, [], SETTINGS).flags).toEqual(flags);
});

test('flags of a record come surest first, with certainties between 0 and 1', () => {
  expect(flags.length).toBeGreaterThan(50);
  for (const { certainty } of flags) {
    expect(certainty).toBeGreaterThan(0);
    expect(certainty).toBeLessThanOrEqual(1);
  }
  flags.forEach((flag, i) => {
    const next = flags[i + 1];
    if (next?.recordId === flag.recordId) expect(flag.certainty).toBeGreaterThanOrEqual(next.certainty);
  });
});

test('touched records get the flags of a full run from stored baselines and their neighbours alone', () => {
  const stored = JSON.parse(JSON.stringify(baselines)) as Baselines;
  const touched = records.filter((_, i) => i % 7 === 0);
  const ids = new Set(touched.map(({ id }) => id));
  const appliances = new Set(touched.map(({ applianceId }) => applianceId));
  const cylinders = new Set(touched.map(({ cylinderId }) => cylinderId));
  const around = records.filter((r) => appliances.has(r.applianceId) || cylinders.has(r.cylinderId));
  expect(around.length).toBeLessThan(records.length);
  const own = flags.filter(({ recordId }) => ids.has(recordId));
  expect(own.length).toBeGreaterThan(10);
  expect(judgeTouched(ids, around, [], stored, SETTINGS)).toEqual(own);
});

test('no records, no flags; one record, nothing but what is plain', () => {
  expect(judgeRecords([], [], SETTINGS).flags).toEqual([]);
  expect(judgeRecords(records.slice(0, 1), [], SETTINGS).flags).toEqual([]);
});

test('an entry error is nobody’s yardstick: leaving it out moves the baselines, not who witnesses', () => {
  const [first] = records;
  const without = judgeRecords(
    records.map((r) => (r === first ? { ...r, isExcluded: true } : r)),
    [],
    SETTINGS,
  );
  expect(without.baselines.records).toBe(baselines.records - 1);
});
