import { quantileSorted } from 'simple-statistics';
import { groupBy } from '../../statistics/group-by';
import { categoryKey, jobKey } from '../kinds';
import type { JudgedRecord } from '../record';
import type { JudgingSettings } from '../settings';

/** What like jobs of others gave: quartiles of the yield and Tukey's lower fence Q1 − 1.5 (Q3 − Q1). */
export type Peers = {
  records: number;
  /** What is alike: category and job type, job type alone, or nothing but the company. */
  alike: 'category and job type' | 'job type' | 'company';
  fromYear: number;
  toYear: number;
  lowerQuartile: number;
  median: number;
  upperQuartile: number;
  lowerFence: number;
};
/** By group and year; with a technician behind where his own jobs are left out. */
export type PeerTable = Record<string, Peers>;

type Level = { alike: Peers['alike']; keyOf: (record: JudgedRecord) => string };
const LEVELS: readonly Level[] = [
  { alike: 'category and job type', keyOf: (record) => `${categoryKey(record)}/${jobKey(record)}` },
  { alike: 'job type', keyOf: (record) => jobKey(record) },
  { alike: 'company', keyOf: () => '' },
];

/** Below this share of a group nobody moves its quartiles by being in it. */
const NOTICEABLE_SHARE = 0.05;

const yearOf = ({ recoveredOn }: JudgedRecord): number => Number(recoveredOn.slice(0, 4));
const keyOf = (level: Level, group: string, year: number, without = ''): string =>
  [level.alike, group, year, without].join('|');

type Job = { recoveryYield: number; year: number; technicianId: string };

const summary = (sorted: readonly Job[], level: Level, fromYear: number, toYear: number): Peers => {
  const yields = sorted.map(({ recoveryYield }) => recoveryYield);
  const [low = 0, median = 0, high = 0] = [0.25, 0.5, 0.75].map((p) => (yields.length ? quantileSorted(yields, p) : 0));
  return {
    records: yields.length,
    alike: level.alike,
    fromYear,
    toYear,
    lowerQuartile: low,
    median,
    upperQuartile: high,
    lowerFence: low - 1.5 * (high - low),
  };
};

/** One group in one year: all of it, and without each technician who makes a noticeable part of it. */
const fitGroup = (
  table: PeerTable,
  level: Level,
  group: string,
  jobs: readonly Job[],
  { year, settings }: { year: number; settings: JudgingSettings },
): void => {
  const fromYear = year - settings.peerYears + 1;
  const near = jobs.filter((job) => job.year >= fromYear && job.year <= year);
  const keep = (sorted: readonly Job[], without?: string) => {
    // A group too small without somebody is none for him, and its key says so by being there without records.
    if (sorted.length >= settings.leastPeers || without)
      table[keyOf(level, group, year, without)] = summary(sorted, level, fromYear, year);
  };
  keep(near);
  const counts = new Map<string, number>();
  for (const { technicianId } of near) counts.set(technicianId, (counts.get(technicianId) ?? 0) + 1);
  for (const [technicianId, count] of counts)
    if (count > NOTICEABLE_SHARE * near.length)
      keep(
        near.filter((job) => job.technicianId !== technicianId),
        technicianId,
      );
};

/** Quartiles of like jobs for every year, without the own jobs of whoever would notice, wider where they are few. */
export const fitPeers = (records: readonly JudgedRecord[], settings: JudgingSettings): PeerTable => {
  const table: PeerTable = {};
  const jobs = records
    .map((record) => ({
      record,
      recoveryYield: record.recoveredMassKg / record.fullChargeKg,
      year: yearOf(record),
      technicianId: record.technicianId,
    }))
    .sort((a, b) => a.recoveryYield - b.recoveryYield);
  const years = [...new Set(jobs.map(({ year }) => year))];
  for (const level of LEVELS)
    for (const [group, own] of groupBy(jobs, ({ record }) => level.keyOf(record)))
      for (const year of years) fitGroup(table, level, group, own, { year, settings });
  return table;
};

/** The narrowest group of like jobs of others that is large enough; null where none is. */
export const peersOf = (table: PeerTable, record: JudgedRecord, settings: JudgingSettings): Peers | null => {
  const year = yearOf(record);
  for (const level of LEVELS)
    for (let back = 0; back < settings.peerYears; back++) {
      const group = level.keyOf(record);
      const found =
        table[keyOf(level, group, year - back, record.technicianId)] ?? table[keyOf(level, group, year - back)];
      if (found && found.records >= settings.leastPeers) return found;
    }
  return null;
};
