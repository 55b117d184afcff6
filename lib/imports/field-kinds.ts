import type { RecoveryField } from './fields';

/** Fields whose cells are masses in the row's unit. */
export const MASS_FIELDS = [
  'nameplate_charge',
  'added_charge',
  'start_weight',
  'end_weight',
  'recovered_mass',
] as const satisfies readonly RecoveryField[];
export type MassField = (typeof MASS_FIELDS)[number];

/** Fields whose cells are pressures in the row's vacuum unit. */
export const PRESSURE_FIELDS = ['final_vacuum', 'hold_rise'] as const satisfies readonly RecoveryField[];

/** Fields whose cells are dates. */
export const DATE_FIELDS = ['recovered_at', 'manufactured_on'] as const satisfies readonly RecoveryField[];

const isOneOf = (fields: readonly RecoveryField[], field: RecoveryField | null): boolean =>
  field !== null && fields.includes(field);

export const isMassField = (field: RecoveryField | null): boolean => isOneOf(MASS_FIELDS, field);
export const isPressureField = (field: RecoveryField | null): boolean => isOneOf(PRESSURE_FIELDS, field);
export const isDateField = (field: RecoveryField | null): boolean => isOneOf(DATE_FIELDS, field);

/** Fields whose cells carry a decimal mark. */
export const isNumberField = (field: RecoveryField | null): boolean =>
  isMassField(field) || isPressureField(field) || field === 'hold_minutes';
