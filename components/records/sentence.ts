import type { RecordDetail } from '@/analytics/records/contract';
import { formatDay, formatDesignation, formatMassWithUnit, formatPercent } from '@/lib/format';
import type { DisplayUnit } from '@/lib/vocabulary';

/** A record in one sentence: who recovered how much of what, where, when, and how much of the full charge that is. */
export const recordSentence = (record: RecordDetail, unit: DisplayUnit): string =>
  `${record.technician} recovered ${formatMassWithUnit(record.recoveredMass, unit, 2)} of ${formatDesignation(record.refrigerant)} from ${record.appliance} at ${record.site} on ${formatDay(record.recoveredOn)}: ${formatPercent(record.yield)} of its full charge.`;
