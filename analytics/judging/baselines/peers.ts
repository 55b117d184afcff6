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
/** By group, year and technician left out. */
export type PeerTable = Record<string, Peers>;

type Level = { alike: Peers['alike']; keyOf: (record: JudgedRecord) => string };
const LEVELS: readonly Level[] = [
  { alike: 'category and job type', keyOf: (record) => `${categoryKey(record)}/${jobKey(record)}` },
  { alike: 'job type', keyOf: (record) => jobKey(record) },
  { alike: 'company', keyOf: () => '' },
];

const yearOf = ({ recoveredOn }: JudgedRecord): number => Number(recoveredOn.slice(0, 4));
const yieldOf = ({ recoveredMassKg, fullChargeKg }: JudgedRecord): number => recoveredMassKg / fullChargeKg;
const keyOf = (level: Level, record: JudgedRecord, year: number): string =>
  [level.alike, level.keyOf(record), year, record.technicianId].join('|');

const summary = (sorted: number[], level: Level, fromYear: number, toYear: number): Peers => {
  const [lowerQuartile, median, upperQuartile] = [0.25, 0.5, 0.75].map((p) => quantileSorted(sorted, p));
  const [low = 0, middle = 0, high = 0] = [lowerQuartile, median, upperQuartile];
  return {
    records: sorted.length,
    alike: level.alike,
    fromYear,
    toYear,
    lowerQuartile: low,
    median: middle,
    upperQuartile: high,
    lowerFence: low - 1.5 * (high - low),
  };
};

/** Quartiles of like jobs for every technician and year, his own jobs left out, wider where they are few. */
export const fitPeers = (records: readonly JudgedRecord[], settings: JudgingSettings): PeerTable => {
  const table: PeerTable = {};
  const sorted = [...records].sort((a, b) => yieldOf(a) - yieldOf(b));
  for (const level of LEVELS)
    for (const group of groupBy(sorted, level.keyOf).values()) {
      for (const year of new Set(group.map(yearOf))) {
        const fromYear = year - settings.peerYears + 1;
        const near = group.filter((record) => yearOf(record) >= fromYear && yearOf(record) <= year);
        for (const [, [own]] of groupBy(
          near.filter((record) => yearOf(record) === year),
          ({ technicianId }) => technicianId,
        )) {
          if (!own) continue;
          const others = near.filter(({ technicianId }) => technicianId !== own.technicianId).map(yieldOf);
          if (others.length >= settings.leastPeers)
            table[keyOf(level, own, year)] = summary(others, level, fromYear, year);
        }
      }
    }
  return table;
};

/** The narrowest group of like jobs that is large enough; null where none is. */
export const peersOf = (table: PeerTable, record: JudgedRecord, settings: JudgingSettings): Peers | null => {
  const year = yearOf(record);
  for (const level of LEVELS)
    for (let back = 0; back < settings.peerYears; back++) {
      const found = table[keyOf(level, record, year - back)];
      if (found) return found;
    }
  return null;
};
