import type { TermId } from '@/lib/glossary/terms';
import type { RecordField } from '@/lib/recoveries/fields';
import {
  APPLIANCE_CATEGORIES,
  CERTIFICATION_TYPES,
  DISPOSITIONS,
  JOB_TYPES,
  MASS_UNITS,
  VACUUM_UNITS,
} from '@/lib/vocabulary';
import { CATEGORY_NAMES, JOB_TYPE_NAMES } from '@/lib/wording';
import { DISPOSITION_NAMES, VACUUM_UNIT_NAMES } from './wording';

export type Choice = { value: string; label: string };

const named = <Word extends string>(words: readonly Word[], names: Record<Word, string>): Choice[] =>
  words.map((value) => ({ value, label: names[value] }));

/** Fields with a closed list of values. */
export const CHOICES: Partial<Record<RecordField, readonly Choice[]>> = {
  jobType: named(JOB_TYPES, JOB_TYPE_NAMES),
  category: named(APPLIANCE_CATEGORIES, CATEGORY_NAMES),
  disposition: named(DISPOSITIONS, DISPOSITION_NAMES),
  technicianCertification: CERTIFICATION_TYPES.map((value) => ({ value, label: value })),
  massUnit: MASS_UNITS.map((value) => ({ value, label: value })),
  vacuumUnit: named(VACUUM_UNITS, VACUUM_UNIT_NAMES),
};

/** Units are chosen, not left open. */
export const ALWAYS_CHOSEN: ReadonlySet<RecordField> = new Set(['massUnit']);

/** Fields a record can't do without; the recovered mass may come from the weights. */
export const NEEDED: ReadonlySet<RecordField> = new Set([
  'recordRef',
  'recoveredAt',
  'technician',
  'site',
  'appliance',
  'refrigerant',
  'nameplateCharge',
  'massUnit',
]);

/** Fields whose text is a number: a phone shows its number keys. */
export const NUMBERS: ReadonlySet<RecordField> = new Set([
  'nameplateCharge',
  'addedCharge',
  'startWeight',
  'endWeight',
  'recoveredMass',
  'finalVacuum',
  'holdMinutes',
  'holdRise',
]);

/** The parts of the form, in the order of the work. */
export const FORM_PARTS: readonly { title: string; fields: readonly RecordField[] }[] = [
  {
    title: 'The job',
    fields: ['recordRef', 'recoveredAt', 'technician', 'branch', 'site', 'appliance', 'jobType', 'category'],
  },
  { title: 'The charge', fields: ['refrigerant', 'massUnit', 'nameplateCharge', 'addedCharge'] },
  { title: 'The scale', fields: ['cylinder', 'startWeight', 'endWeight', 'recoveredMass'] },
  { title: 'Vacuum and hold', fields: ['finalVacuum', 'vacuumUnit', 'holdMinutes', 'holdRise'] },
  { title: 'Afterwards', fields: ['disposition', 'technicianCertification', 'manufacturedOn', 'notes'] },
];

/** Fields whose word is explained in the glossary. */
export const FIELD_TERMS: Partial<Record<RecordField, TermId>> = {
  jobType: 'job-type',
  category: 'appliance-category',
  nameplateCharge: 'nameplate-charge',
  addedCharge: 'added-charge',
  cylinder: 'cylinder',
  recoveredMass: 'recovered-mass',
  finalVacuum: 'final-vacuum',
  holdMinutes: 'hold',
  holdRise: 'hold-rise',
  disposition: 'disposition',
  technicianCertification: 'technician-certification',
};

export const HINTS: Partial<Record<RecordField, string>> = {
  recordRef: 'The number on the ticket',
  addedCharge: 'For long line sets, on top of the nameplate',
  startWeight: 'Cylinder on the scale before the pull',
  endWeight: 'The same cylinder after it',
  recoveredMass: 'Leave empty when both weights are there',
  holdMinutes: 'The wait after pull-down',
  holdRise: 'Pressure regained while waiting',
};
