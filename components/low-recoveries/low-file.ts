import type { LowRecovery } from '@/analytics/low-recoveries/contract';
import type { ScopeSelection } from '@/analytics/scope-address';
import { figureScopePhrase } from '@/components/figures/wording';
import { type FileTable, massCell } from '@/components/files/file-table';
import { choiceName } from '@/components/scope/wording';
import { plainCharacters } from '@/lib/format';

/** The low recoveries for a file, each with where it lies among like jobs. */
export const lowFile = (items: readonly LowRecovery[], scope: ScopeSelection): FileTable => ({
  title: 'Low recoveries',
  scopeWords: plainCharacters(figureScopePhrase(scope)),
  unit: scope.unit,
  columns: [
    { label: 'Record', kind: 'text' },
    { label: 'Recovered on', kind: 'day' },
    { label: 'Technician', kind: 'text' },
    { label: 'Site', kind: 'text' },
    { label: 'Appliance', kind: 'text' },
    { label: 'Refrigerant', kind: 'text' },
    { label: 'Category', kind: 'text' },
    { label: `Recovered, ${scope.unit}`, kind: 'mass' },
    { label: `Full charge, ${scope.unit}`, kind: 'mass' },
    { label: 'Yield', kind: 'share' },
    { label: 'Lower fence', kind: 'share' },
    { label: 'Median of like jobs', kind: 'share' },
    { label: 'Like jobs', kind: 'count' },
  ],
  rows: items.map((item) => [
    item.recordRef,
    item.recoveredOn,
    item.technician,
    item.site,
    item.appliance,
    item.refrigerant,
    choiceName('category', item.category),
    massCell(item.recoveredMass, scope.unit),
    massCell(item.fullCharge, scope.unit),
    item.yield,
    item.lowerFence,
    item.medianYield,
    item.likeJobs,
  ]),
});
