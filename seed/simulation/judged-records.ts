import type { JudgedRecord } from '@/analytics/judging/record';
import { CATALOGUE } from '@/db/catalogue/refrigerants';
import { profileFile, readRows } from '@/lib/imports/read-file';
import type { ParsedRow, ReadContext, RecoveryRow } from '@/lib/imports/rows';
import { requiredLevelKpaAbs } from '@/lib/trade/evacuation-level';

const numberOf = (text: string | null): number | null => (text === null ? null : Number(text));

const requiredLevel = (row: RecoveryRow, fullChargeKg: number): number | null => {
  const pressureClass = CATALOGUE.find(({ designation }) => designation === row.refrigerant)?.pressureClass;
  return pressureClass ? requiredLevelKpaAbs(pressureClass, fullChargeKg, row.category) : null;
};

/** A row of the reader as it is judged; names stand for the identifiers of a database. */
const judgedRecord = (row: RecoveryRow, id: string): JudgedRecord => {
  const nameplateChargeKg = Number(row.nameplateChargeKg);
  const fullChargeKg = nameplateChargeKg + Number(row.addedChargeKg);
  return {
    id,
    recordRef: row.recordRef,
    recoveredOn: row.recoveredOn,
    recoveredAt: row.recoveredAt,
    technicianId: row.technician,
    siteId: row.site,
    applianceId: `${row.site}/${row.appliance}`,
    cylinderId: row.cylinder,
    category: row.category,
    jobType: row.jobType,
    refrigerant: row.refrigerant,
    nameplateChargeKg,
    fullChargeKg,
    startWeightKg: numberOf(row.startWeightKg),
    endWeightKg: numberOf(row.endWeightKg),
    recoveredMassKg: Number(row.recoveredMassKg),
    massUnit: row.massUnit,
    finalVacuumKpaAbs: numberOf(row.finalVacuumKpaAbs),
    vacuumUnit: row.vacuumUnit,
    holdMinutes: numberOf(row.holdMinutes),
    holdRiseKpa: numberOf(row.holdRiseKpa),
    requiredLevelKpaAbs: requiredLevel(row, fullChargeKg),
    decisions: [],
    isExcluded: false,
  };
};

/**
 * Reads a recovery file with the import's own reader, without a database. The id of a record is the number of its row,
 * counted from 1 below the header; `refused` are the rows that an import would refuse.
 */
export const judgedRecordsOf = async (
  file: string,
  today = '2026-12-01',
): Promise<{ records: JudgedRecord[]; refused: number[] }> => {
  const context: ReadContext = {
    fileName: 'recoveries.csv',
    timeZone: 'America/New_York',
    refrigerants: new Set(CATALOGUE.map(({ designation }) => designation)),
    today,
  };
  const bytes = new TextEncoder().encode(file);
  const open = async function* () {
    yield bytes;
  };
  const plan = await profileFile(open, {}, null, context);
  const parsed: ParsedRow[] = [];
  for await (const batch of readRows(open, plan, context)) parsed.push(...batch);
  const rowOf = ({ line }: ParsedRow) => line - 1;
  return {
    records: parsed.flatMap((row) => (row.ok ? [judgedRecord(row.row, String(rowOf(row)))] : [])),
    refused: parsed.filter(({ ok }) => !ok).map(rowOf),
  };
};
