import type { ScopeSelection } from '@/analytics/scope-address';
import type { TechnicianRow } from '@/analytics/technicians/contract';
import { figureScopePhrase } from '@/components/figures/wording';
import { type FileTable, massCell } from '@/components/files/file-table';
import { plainCharacters } from '@/lib/format';

/** The crew's table for a file, in the order of names. */
export const techniciansFile = (items: readonly TechnicianRow[], scope: ScopeSelection): FileTable => ({
  title: 'Recoveries by technician',
  scopeWords: plainCharacters(figureScopePhrase(scope)),
  unit: scope.unit,
  columns: [
    { label: 'Technician', kind: 'text' },
    { label: 'Recoveries', kind: 'count' },
    { label: `Recovered, ${scope.unit}`, kind: 'mass' },
    { label: `Full charge, ${scope.unit}`, kind: 'mass' },
    { label: 'Total yield', kind: 'share' },
    { label: 'Median yield', kind: 'share' },
    { label: 'First', kind: 'day' },
    { label: 'Last', kind: 'day' },
  ],
  rows: items.map((row) => [
    row.technician,
    row.recoveries,
    massCell(row.recoveredMass, scope.unit),
    massCell(row.fullCharge, scope.unit),
    row.totalYield,
    row.medianYield,
    row.firstRecoveredOn,
    row.lastRecoveredOn,
  ]),
});
