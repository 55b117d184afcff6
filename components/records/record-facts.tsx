'use client';

import type { RecordDetail } from '@/analytics/records/contract';
import { formatDay, formatNumber } from '@/lib/format';
import { FIELD_LABELS, type RecordField } from '@/lib/recoveries/fields';
import { fieldValue, RISE_UNIT_NAMES, VACUUM_UNIT_NAMES } from './wording';

const SHOWN: readonly RecordField[] = [
  'technician',
  'branch',
  'site',
  'appliance',
  'category',
  'jobType',
  'refrigerant',
  'cylinder',
  'disposition',
  'finalVacuum',
  'holdMinutes',
  'holdRise',
  'technicianCertification',
  'manufacturedOn',
  'notes',
];

const factOf = (record: RecordDetail, field: RecordField): string => {
  const text = record.entered[field] ?? '';
  if (text === '') return '';
  if (field === 'manufacturedOn') return formatDay(text);
  if (field === 'holdMinutes') return `${text} min`;
  if (field !== 'finalVacuum' && field !== 'holdRise') return fieldValue(field, text);
  const { vacuumUnit, finalVacuumKpaAbs: kpa } = record;
  if (!vacuumUnit) return text;
  if (field === 'holdRise') return `${text} ${RISE_UNIT_NAMES[vacuumUnit]}`;
  const absolute = kpa === null || vacuumUnit === 'kpa_abs' ? '' : ` (${formatNumber(kpa, 2)} kPa absolute)`;
  return `${text} ${VACUUM_UNIT_NAMES[vacuumUnit]}${absolute}`;
};

const Fact = ({ label, value }: { label: string; value: string }) => (
  <div className="border-b border-rule-2 py-2 sm:grid sm:grid-cols-[12rem_1fr] sm:gap-4">
    <dt className="text-sm text-ink-2 sm:text-base">{label}</dt>
    <dd className="min-w-0 break-words">{value || <span className="text-ink-3">not stated</span>}</dd>
  </div>
);

/** Every field of a record, stated or not, and the columns of its file that the product has no field for. */
export const RecordFacts = ({ record }: { record: RecordDetail }) => (
  <dl>
    {SHOWN.map((field) => (
      <Fact key={field} label={FIELD_LABELS[field]} value={factOf(record, field)} />
    ))}
    {Object.entries(record.extra).map(([column, text]) => (
      <Fact key={column} label={column} value={text} />
    ))}
  </dl>
);
