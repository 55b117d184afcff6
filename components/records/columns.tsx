import { columnVisibilityFeature, createColumnHelper, rowSortingFeature, tableFeatures } from '@tanstack/react-table';
import type { RecordRow } from '@/analytics/records/contract';
import { formatDay, formatDesignation, formatMass, formatPercent } from '@/lib/format';
import type { DisplayUnit } from '@/lib/vocabulary';
import { CATEGORY_NAMES, JOB_TYPE_NAMES } from '@/lib/wording';
import { COLUMN_NAMES, type ColumnId } from './column-list';
import { RecordLink } from './record-link';

/** The server sorts and pages; the table only knows by what, and which columns stand. */
export const RECORD_TABLE_FEATURES = tableFeatures({ columnVisibilityFeature, rowSortingFeature });

const helper = createColumnHelper<typeof RECORD_TABLE_FEATURES, RecordRow>();

/** Columns whose figures stand right. */
export const NUMERIC_COLUMNS: ReadonlySet<string> = new Set<ColumnId>(['recoveredMass', 'fullCharge', 'yield']);

const Unstated = () => <span className="text-ink-3">—</span>;

/** The columns of the table of records, masses in the given unit. */
export const recordColumns = (unit: DisplayUnit) =>
  helper.columns([
    helper.accessor('recordRef', {
      header: COLUMN_NAMES.recordRef,
      cell: ({ row }) => (
        <RecordLink id={row.original.id} className="link font-medium whitespace-nowrap">
          {row.original.recordRef}
        </RecordLink>
      ),
    }),
    helper.accessor('recoveredOn', {
      header: COLUMN_NAMES.recoveredOn,
      cell: ({ getValue }) => <span className="whitespace-nowrap">{formatDay(getValue())}</span>,
    }),
    helper.accessor('technician', { header: COLUMN_NAMES.technician }),
    helper.accessor('site', { header: COLUMN_NAMES.site }),
    helper.accessor('appliance', { header: COLUMN_NAMES.appliance }),
    helper.accessor('branch', { header: COLUMN_NAMES.branch, cell: ({ getValue }) => getValue() ?? <Unstated /> }),
    helper.accessor('category', {
      header: COLUMN_NAMES.category,
      cell: ({ row }) => (row.original.category ? CATEGORY_NAMES[row.original.category] : <Unstated />),
    }),
    helper.accessor('jobType', {
      header: COLUMN_NAMES.jobType,
      cell: ({ row }) => (row.original.jobType ? JOB_TYPE_NAMES[row.original.jobType] : <Unstated />),
    }),
    helper.accessor('refrigerant', {
      header: COLUMN_NAMES.refrigerant,
      cell: ({ getValue }) => <span className="whitespace-nowrap">{formatDesignation(getValue())}</span>,
    }),
    helper.accessor('recoveredMass', {
      header: `${COLUMN_NAMES.recoveredMass}, ${unit}`,
      cell: ({ getValue }) => formatMass(getValue(), unit, 2),
    }),
    helper.accessor('fullCharge', {
      header: `${COLUMN_NAMES.fullCharge}, ${unit}`,
      cell: ({ getValue }) => formatMass(getValue(), unit, 2),
    }),
    helper.accessor('yield', {
      header: COLUMN_NAMES.yield,
      cell: ({ row }) =>
        row.original.exclusion ? (
          <span className="marked" title="Left out of the figures as an entry error">
            {formatPercent(row.original.yield)}
          </span>
        ) : (
          formatPercent(row.original.yield)
        ),
    }),
    helper.accessor('cylinder', { header: COLUMN_NAMES.cylinder, cell: ({ getValue }) => getValue() ?? <Unstated /> }),
  ]);
