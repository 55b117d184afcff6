import type { ScopeSelection } from '@/analytics/scope-address';
import type { SiteRow } from '@/analytics/sites/contract';
import { figureScopePhrase } from '@/components/figures/wording';
import { type FileTable, massCell } from '@/components/files/file-table';
import { plainCharacters } from '@/lib/format';

/** The table of sites for a file, in the order of names. */
export const sitesFile = (items: readonly SiteRow[], scope: ScopeSelection): FileTable => ({
  title: 'Recoveries by site',
  scopeWords: plainCharacters(figureScopePhrase(scope)),
  unit: scope.unit,
  columns: [
    { label: 'Site', kind: 'text' },
    { label: 'Recoveries', kind: 'count' },
    { label: 'Appliances', kind: 'count' },
    { label: `Recovered, ${scope.unit}`, kind: 'mass' },
    { label: `Full charge, ${scope.unit}`, kind: 'mass' },
    { label: 'Total yield', kind: 'share' },
    { label: 'Median yield', kind: 'share' },
    { label: 'Last', kind: 'day' },
  ],
  rows: items.map((row) => [
    row.site,
    row.recoveries,
    row.appliances,
    massCell(row.recoveredMass, scope.unit),
    massCell(row.fullCharge, scope.unit),
    row.totalYield,
    row.medianYield,
    row.lastRecoveredOn,
  ]),
});
