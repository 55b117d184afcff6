import Link from 'next/link';
import type { ApplianceRow } from '@/analytics/appliances/contract';
import { onlyOf, type ScopeSelection } from '@/analytics/scope-address';
import {
  FIRST,
  type GroupedColumn,
  LAST,
  LEAK_SUSPICION,
  LOW,
  MASS_COLUMNS,
  RECOVERIES,
} from '@/components/grouped-figures/column';
import { choiceName } from '@/components/scope/wording';
import { formatDesignation } from '@/lib/format';

const [recovered, , totalYield, medianYield] = MASS_COLUMNS;

/** An appliance is told by its site and its name together: two sites may both have an "RTU-1". */
export const ownApplianceScope = (scope: ScopeSelection, { site, appliance }: ApplianceRow): ScopeSelection =>
  onlyOf(onlyOf(scope, 'site', [site]), 'appliance', [appliance]);
export const applianceId = (row: ApplianceRow): string => row.applianceId;

/** What is told of an appliance, in the order in which it is asked for. */
export const APPLIANCE_COLUMNS: readonly GroupedColumn<ApplianceRow>[] = [
  {
    id: 'appliance',
    label: 'Appliance',
    kind: 'text',
    heads: true,
    value: ({ appliance }) => appliance,
    draw: ({ applianceId: id, appliance, site }) => (
      <>
        <Link href={`/appliances/${id}`} className="link">
          {formatDesignation(appliance)}
        </Link>
        <span className="block text-sm text-ink-2">{site}</span>
      </>
    ),
  },
  { id: 'site', label: 'Site', kind: 'text', value: ({ site }) => site, onlyInFile: true },
  LOW,
  LEAK_SUSPICION,
  RECOVERIES,
  {
    id: 'refrigerant',
    label: 'Refrigerant',
    kind: 'text',
    value: ({ refrigerant }) => refrigerant,
    draw: ({ refrigerant, category }) => (
      <>
        {formatDesignation(refrigerant)}
        <span className="block text-sm text-ink-2">{choiceName('category', category)}</span>
      </>
    ),
  },
  { id: 'category', label: 'Category', kind: 'text', value: ({ category }) => category, onlyInFile: true },
  { id: 'unitCharge', label: 'Unit holds', kind: 'mass', value: ({ unitCharge }) => unitCharge },
  ...[recovered, totalYield, medianYield].filter((column) => column !== undefined),
  FIRST,
  LAST,
];
