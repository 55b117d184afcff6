import 'server-only';
import { and, eq, sql } from 'drizzle-orm';
import type { Tx } from '@/db/client';
import { imports } from '@/db/schema/imports';
import { recoveries as r } from '@/db/schema/recoveries';
import { recoveryFacts as f } from '@/db/views/recovery-facts';
import { yieldLimits as limits } from '@/db/views/yield-limits';
import { LEAST_LIKE_JOBS } from '@/lib/like-jobs';
import { getStored } from '@/lib/recoveries/stored';
import { storedTexts } from '@/lib/recoveries/stored-texts';
import { kgToGram } from '@/lib/units';
import type { RecordDetail } from './contract';
import { rowColumns, toRow } from './row';

const grams = (kg: string | null): number | null => (kg === null ? null : kgToGram(Number(kg)));
const number = (text: string | null): number | null => (text === null ? null : Number(text));
const iso = (instant: string): string => new Date(instant).toISOString();

const getSource = async (tx: Tx, importId: string | null, line: number | null): Promise<RecordDetail['source']> => {
  if (!importId) return null;
  const [file] = await tx.select({ fileName: imports.fileName }).from(imports).where(eq(imports.id, importId));
  return file ? { importId, fileName: file.fileName, line } : null;
};

/** What is usual among jobs with the same refrigerant and category; null where there are too few to say. */
const getLikeJobs = async (tx: Tx, refrigerant: string, category: string | null): Promise<RecordDetail['likeJobs']> => {
  const [found] = await tx
    .select()
    .from(limits)
    .where(and(eq(limits.refrigerant, refrigerant), sql`${limits.category} is not distinct from ${category}`));
  if (!found || found.likeJobs < LEAST_LIKE_JOBS) return null;
  const { likeJobs: count, lowerFence, lowerQuartile, medianYield: median, upperQuartile } = found;
  return { count, lowerFence, lowerQuartile, median, upperQuartile };
};

/** Everything one record says; null when there is none that this transaction may see. */
export const getRecord = async (tx: Tx, id: string, timeZone: string): Promise<RecordDetail | null> => {
  const [facts] = await tx.select(rowColumns).from(f).where(eq(f.id, id));
  const [record] = await tx.select().from(r).where(eq(r.id, id));
  const stored = await getStored(tx, id, timeZone);
  if (!facts || !record || !stored) return null;
  return {
    ...toRow(facts),
    nameplateCharge: kgToGram(Number(record.nameplateChargeKg)),
    addedCharge: kgToGram(Number(record.addedChargeKg)),
    startWeight: grams(record.startWeightKg),
    endWeight: grams(record.endWeightKg),
    massUnit: record.massUnit,
    finalVacuumKpaAbs: number(record.finalVacuumKpaAbs),
    vacuumUnit: record.vacuumUnit,
    holdMinutes: record.holdMinutes,
    holdRiseKpa: number(record.holdRiseKpa),
    disposition: record.disposition,
    manufacturedOn: record.manufacturedOn,
    technicianCertification: record.technicianCertification,
    notes: record.notes,
    entered: storedTexts(stored.record),
    extra: record.extra,
    source: await getSource(tx, record.importId, record.importLine),
    likeJobs: await getLikeJobs(tx, record.refrigerant, record.category),
    createdAt: iso(record.createdAt),
    updatedAt: iso(record.updatedAt),
  };
};
