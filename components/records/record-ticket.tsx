'use client';

import type { RecordDetail } from '@/analytics/records/contract';
import { Ticket, type TicketRow } from '@/components/ui/ticket';
import { useViewer } from '@/components/viewer-context';
import { formatDay, formatInstant, formatMass, formatMassWithUnit, formatPercent } from '@/lib/format';
import type { RecordField } from '@/lib/recoveries/fields';

/** One record as the ticket the scale would print: net in the reader's unit, each weight also as it was typed. */
export const RecordTicket = ({ record }: { record: RecordDetail }) => {
  const { massUnit: unit, timeZone } = useViewer();
  const typed = (field: RecordField): string | undefined => {
    const text = record.entered[field];
    return text && record.massUnit !== unit ? `typed ${text} ${record.massUnit}` : undefined;
  };
  const weight = (label: string, kg: number | null, field: RecordField): TicketRow => ({
    label,
    value: kg === null ? '—' : formatMassWithUnit(kg, unit, 2),
    small: typed(field),
  });
  const rows: TicketRow[] = [
    weight('End weight', record.endWeight, 'endWeight'),
    weight('Start weight', record.startWeight, 'startWeight'),
    {
      ...weight('Recovered mass', record.recoveredMass, 'recoveredMass'),
      ...(record.entered.recoveredMass ? {} : { small: 'end less start' }),
    },
    weight('Nameplate charge', record.nameplateCharge, 'nameplateCharge'),
    ...(record.addedCharge ? [weight('Added charge', record.addedCharge, 'addedCharge')] : []),
    { label: 'Full charge', value: formatMassWithUnit(record.fullCharge, unit, 2) },
    { label: 'Yield', value: formatPercent(record.yield, 1) },
  ];
  return (
    <Ticket
      heading={record.recordRef}
      of={record.recoveredAt ? formatInstant(record.recoveredAt, timeZone) : formatDay(record.recoveredOn)}
      net={{ figure: formatMass(record.recoveredMass, unit, 2), unit: `${unit} net` }}
      rows={rows}
    />
  );
};
