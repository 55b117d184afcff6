import { massToKg, massToMicrograms } from '@/lib/units';
import type { MassUnit, VacuumUnit } from '@/lib/vocabulary';
import { FILE_COLUMNS, type RecordField, type RecordTexts } from './fields';
import { massText, riseText, vacuumText } from './unit-text';

/** A record as the database keeps it, ids resolved to names. Masses are decimal kilograms, pressures kPa. */
export type StoredRecord = {
  recordRef: string;
  /** The local date, or date and time, as `whenText` writes it. */
  recoveredWhen: string;
  technician: string;
  site: string;
  appliance: string;
  branch: string | null;
  jobType: string | null;
  category: string | null;
  refrigerant: string;
  nameplateChargeKg: string;
  addedChargeKg: string;
  startWeightKg: string | null;
  endWeightKg: string | null;
  recoveredMassKg: string;
  massUnit: MassUnit;
  finalVacuumKpaAbs: string | null;
  vacuumUnit: VacuumUnit | null;
  holdMinutes: number | null;
  holdRiseKpa: string | null;
  cylinder: string | null;
  disposition: string | null;
  manufacturedOn: string | null;
  technicianCertification: string | null;
  notes: string | null;
  entered: Record<string, string>;
};

const typed = (record: StoredRecord, field: RecordField): string => record.entered[FILE_COLUMNS[field]]?.trim() ?? '';

const followsFromWeights = ({ startWeightKg, endWeightKg, recoveredMassKg }: StoredRecord): boolean => {
  const [start, end, recovered] = [startWeightKg ?? '', endWeightKg ?? '', recoveredMassKg].map((kg) =>
    massToMicrograms(kg, 'kg'),
  );
  return typeof start === 'bigint' && typeof end === 'bigint' && end - start === recovered;
};

// What was typed is kept to the letter as long as it still means what is stored: 12.50 lb stays 12.50.
const massTexts = (record: StoredRecord) => {
  const text = (field: RecordField, kg: string | null): string =>
    kg !== null && massToKg(typed(record, field), record.massUnit) === massToKg(kg, 'kg')
      ? typed(record, field)
      : massText(kg, record.massUnit);
  const added = text('addedCharge', record.addedChargeKg);
  return {
    nameplateCharge: text('nameplateCharge', record.nameplateChargeKg),
    addedCharge: Number(record.addedChargeKg) === 0 ? typed(record, 'addedCharge') && added : added,
    startWeight: text('startWeight', record.startWeightKg),
    endWeight: text('endWeight', record.endWeightKg),
    // A mass that nobody stated follows from the weights, and goes on following them.
    recoveredMass:
      typed(record, 'recoveredMass') === '' && followsFromWeights(record)
        ? ''
        : text('recoveredMass', record.recoveredMassKg),
  };
};

const pressureTexts = (record: StoredRecord) => {
  const number = (kpa: string | null) => (kpa === null ? null : Number(kpa));
  return {
    finalVacuum: vacuumText(number(record.finalVacuumKpaAbs), record.vacuumUnit),
    holdRise: riseText(number(record.holdRiseKpa), record.vacuumUnit),
  };
};

/**
 * A record as the texts that would be typed to write it, by field: the same for the export, the correction form and the
 * history. Read again, the texts give the same record.
 */
export const storedTexts = (record: StoredRecord): RecordTexts => ({
  recordRef: record.recordRef,
  recoveredAt: record.recoveredWhen,
  technician: record.technician,
  site: record.site,
  appliance: record.appliance,
  branch: record.branch ?? '',
  jobType: record.jobType ?? '',
  category: record.category ?? '',
  refrigerant: record.refrigerant,
  ...massTexts(record),
  massUnit: record.massUnit,
  ...pressureTexts(record),
  vacuumUnit: record.vacuumUnit ?? '',
  holdMinutes: record.holdMinutes === null ? '' : String(record.holdMinutes),
  cylinder: record.cylinder ?? '',
  disposition: record.disposition ?? '',
  manufacturedOn: record.manufacturedOn ?? '',
  technicianCertification: record.technicianCertification ?? '',
  notes: record.notes ?? '',
});
