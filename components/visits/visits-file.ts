import type { Visit } from '@/analytics/visits/contract';
import { type FileTable, massCell } from '@/components/files/file-table';
import { choiceName } from '@/components/scope/wording';
import type { DisplayUnit } from '@/lib/vocabulary';

/** The visits to a place for a file, in the order of time; `place` says which. */
export const visitsFile = (place: string, visits: readonly Visit[], unit: DisplayUnit): FileTable => ({
  title: `Visits to ${place}`,
  scopeWords: `${place}, the whole time`,
  unit,
  columns: [
    { label: 'Recovered on', kind: 'day' },
    { label: 'Record', kind: 'text' },
    { label: 'Appliance', kind: 'text' },
    { label: 'Job type', kind: 'text' },
    { label: 'Technician', kind: 'text' },
    { label: 'Refrigerant', kind: 'text' },
    { label: `Nameplate charge, ${unit}`, kind: 'mass' },
    { label: `Full charge, ${unit}`, kind: 'mass' },
    { label: `Recovered, ${unit}`, kind: 'mass' },
    { label: 'Yield', kind: 'share' },
    { label: 'Stands', kind: 'text' },
  ],
  rows: visits.map((visit) => [
    visit.recoveredOn,
    visit.recordRef,
    visit.appliance,
    choiceName('jobType', visit.jobType),
    visit.technician,
    visit.refrigerant,
    massCell(visit.nameplateCharge, unit),
    massCell(visit.fullCharge, unit),
    massCell(visit.recoveredMass, unit),
    visit.yield,
    visit.counts ? (visit.low ? 'far below like jobs' : '') : 'entry error',
  ]),
});
