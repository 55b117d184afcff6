import type { JudgedCylinder, JudgedRecord } from '@/analytics/judging/record';
import { fences } from '@/analytics/statistics/robust/fences';
import { quantile } from '@/analytics/statistics/robust/quantile';
import type { FlagRule } from '@/lib/vocabulary';

/** A reason to look at a record, as judging finds it. */
export type FoundFlag = { recordId: string; rule: FlagRule; certainty: number; evidence: Record<string, unknown> };

type Usual = { lower: number; q1: number; median: number; q3: number; n: number };
/** What is usual, as it is stored: JSON. */
export type Baselines = Record<string, Usual>;

/** Version and settings of the judging; another one judges everything anew. */
export const JUDGING = 'low fence 1';

const LEAST = 20;
const kindOf = ({ refrigerant, category }: JudgedRecord) => `${refrigerant}|${category ?? ''}`;
const yieldOf = ({ recoveredMassKg, fullChargeKg }: JudgedRecord) => recoveredMassKg / fullChargeKg;

const usual = (yields: number[]): Usual | null => {
  const [fence, q1, median, q3] = [fences(yields), ...[0.25, 0.5, 0.75].map((p) => quantile(yields, p))];
  if (yields.length < LEAST || !fence?.enough || !q1?.enough || !median?.enough || !q3?.enough) return null;
  return { lower: fence.value.lower, q1: q1.value, median: median.value, q3: q3.value, n: yields.length };
};

const judgeOne = (record: JudgedRecord, baselines: Baselines): FoundFlag[] => {
  const peers = baselines[kindOf(record)];
  const share = yieldOf(record);
  if (!peers || record.isExcluded || share >= peers.lower) return [];
  return [{ recordId: record.id, rule: 'low_unexplained', certainty: 0.5, evidence: { yield: share, ...peers } }];
};

/** Judges all records of a company and says what is usual there. */
export const judgeAll = (
  records: readonly JudgedRecord[],
  _cylinders: readonly JudgedCylinder[],
): { flags: FoundFlag[]; baselines: Baselines } => {
  const yields = new Map<string, number[]>();
  for (const record of records) {
    if (record.isExcluded) continue;
    const kind = kindOf(record);
    yields.set(kind, [...(yields.get(kind) ?? []), yieldOf(record)]);
  }
  const baselines: Baselines = {};
  for (const [kind, values] of yields) {
    const found = usual(values);
    if (found) baselines[kind] = found;
  }
  return { flags: records.flatMap((record) => judgeOne(record, baselines)), baselines };
};

/** Judges some records by what was found usual before; `records` holds the others of their appliances and cylinders too. */
export const judgeSome = (
  due: ReadonlySet<string>,
  records: readonly JudgedRecord[],
  _cylinders: readonly JudgedCylinder[],
  baselines: Baselines,
): FoundFlag[] => records.filter(({ id }) => due.has(id)).flatMap((record) => judgeOne(record, baselines));
