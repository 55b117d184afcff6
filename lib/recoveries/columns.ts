import 'server-only';
import type { RecoveryRow } from '@/lib/imports/rows';
import type { NameIds } from './names';

/** The columns of the recoveries table that a typed record fills. */
export const recordColumns = (row: RecoveryRow, ids: NameIds) => ({
  ...ids,
  recordRef: row.recordRef,
  recoveredOn: row.recoveredOn,
  recoveredAt: row.recoveredAt,
  category: row.category,
  jobType: row.jobType,
  refrigerant: row.refrigerant,
  nameplateChargeKg: row.nameplateChargeKg,
  addedChargeKg: row.addedChargeKg,
  startWeightKg: row.startWeightKg,
  endWeightKg: row.endWeightKg,
  recoveredMassKg: row.recoveredMassKg,
  massUnit: row.massUnit,
  finalVacuumKpaAbs: row.finalVacuumKpaAbs,
  vacuumUnit: row.vacuumUnit,
  holdMinutes: row.holdMinutes === null ? null : Number(row.holdMinutes),
  holdRiseKpa: row.holdRiseKpa,
  disposition: row.disposition,
  manufacturedOn: row.manufacturedOn,
  technicianCertification: row.technicianCertification,
  notes: row.notes,
  entered: row.entered,
});
