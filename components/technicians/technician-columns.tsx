import Link from 'next/link';
import { onlyOf, type ScopeSelection } from '@/analytics/scope-address';
import type { TechnicianRow } from '@/analytics/technicians/contract';
import { FIRST, type GroupedColumn, LAST, MASS_COLUMNS, RECOVERIES } from '@/components/grouped-figures/column';
import { EffectRange } from './effect-range';
import { VerdictWord, verdictAside } from './verdict';
import { effectOf } from './wording';

/** Ranges longer than this are cut: those of newcomers would make all others dots. Points of nameplate. */
const REACH = 20;

const [recovered, fullCharge, totalYield, medianYield] = MASS_COLUMNS;
const present = <Column,>(column: Column | undefined): column is Column => column !== undefined;

export const ownTechnicianScope = (scope: ScopeSelection, { technician }: TechnicianRow): ScopeSelection =>
  onlyOf(scope, 'technician', [technician]);
export const technicianRowId = ({ technicianId }: TechnicianRow): string => technicianId;

const pointsInFile = (
  id: string,
  label: string,
  value: (row: TechnicianRow) => number | null,
): GroupedColumn<TechnicianRow> => ({ id, label, kind: 'points', value, onlyInFile: true });

/** What is told of a technician: how he compares with like jobs first, then what he did. */
export const TECHNICIAN_COLUMNS: readonly GroupedColumn<TechnicianRow>[] = [
  {
    id: 'technician',
    label: 'Technician',
    kind: 'text',
    heads: true,
    value: ({ technician }) => technician,
    draw: ({ technicianId, technician }) => (
      <Link href={`/technicians/${technicianId}`} className="link">
        {technician}
      </Link>
    ),
  },
  {
    id: 'verdict',
    label: 'Against like jobs',
    kind: 'text',
    value: ({ verdict }) => verdict,
    draw: (row) => <VerdictWord result={row} />,
  },
  { id: 'aside', label: 'Besides', kind: 'text', value: verdictAside, onlyInFile: true },
  {
    id: 'effect',
    label: 'Points of nameplate, likely range',
    kind: 'points',
    value: ({ effect }) => effect,
    draw: (row) => {
      const effect = effectOf(row);
      return effect ? <EffectRange effect={effect} reach={REACH} isMarked={row.verdict === 'below'} /> : '—';
    },
  },
  pointsInFile('low', 'Likely from', ({ low }) => low),
  pointsInFile('high', 'Likely to', ({ high }) => high),
  { id: 'judgedJobs', label: 'Jobs judged', kind: 'count', value: ({ judgedJobs }) => judgedJobs, onlyInFile: true },
  ...[RECOVERIES, recovered].filter(present),
  { id: 'expectedMass', label: 'Expected', kind: 'mass', value: ({ expectedMass }) => expectedMass },
  { id: 'observedMass', label: 'Observed', kind: 'mass', value: ({ observedMass }) => observedMass },
  ...[fullCharge, totalYield].filter(present).map((column) => ({ ...column, onlyInFile: true })),
  ...[medianYield].filter(present),
  ...[FIRST, LAST].map((column) => ({ ...column, onlyInFile: true })),
];
