import Link from 'next/link';
import type { Visit } from '@/analytics/visits/contract';
import { choiceName } from '@/components/scope/wording';
import { Table, Td, Th } from '@/components/ui/table';
import { formatDay, formatDesignation, formatMass, formatPercent } from '@/lib/format';
import type { DisplayUnit } from '@/lib/vocabulary';

const standing = ({ low, counts }: Visit): string => {
  if (!counts) return 'entry error';
  return low ? 'far below' : '';
};

type VisitsTableProps = {
  label: string;
  visits: readonly Visit[];
  unit: DisplayUnit;
  /** Visits at which the nameplate was written down otherwise than before, by their record's id. */
  changed: ReadonlySet<string>;
  /** A site's visits are at several units. */
  withAppliance?: boolean;
};

/** Visits in figures, the newest first; each leads to its record. */
export const VisitsTable = ({ label, visits, unit, changed, withAppliance = false }: VisitsTableProps) => (
  <Table label={label}>
    <thead>
      <tr>
        <Th>Day</Th>
        <Th>Record</Th>
        {withAppliance ? <Th>Appliance</Th> : null}
        <Th>Job, technician</Th>
        <Th>Refrigerant</Th>
        <Th numeric>Nameplate, {unit}</Th>
        <Th numeric>Full charge, {unit}</Th>
        <Th numeric>Recovered, {unit}</Th>
        <Th numeric>Yield</Th>
      </tr>
    </thead>
    <tbody>
      {[...visits].reverse().map((visit) => (
        <tr key={visit.recoveryId} className={visit.counts ? undefined : 'text-ink-2'}>
          <Th scope="row" className="whitespace-nowrap">
            {formatDay(visit.recoveredOn)}
          </Th>
          <Td>
            <Link href={`/records/${visit.recoveryId}`} className="link">
              {visit.recordRef}
            </Link>
          </Td>
          {withAppliance ? <Td>{formatDesignation(visit.appliance)}</Td> : null}
          <Td>
            {choiceName('jobType', visit.jobType)}, {visit.technician}
          </Td>
          <Td>{formatDesignation(visit.refrigerant)}</Td>
          <Td numeric>
            {changed.has(visit.recoveryId) ? (
              <span className="marked">{formatMass(visit.nameplateCharge, unit)}</span>
            ) : (
              formatMass(visit.nameplateCharge, unit)
            )}
          </Td>
          <Td numeric>{formatMass(visit.fullCharge, unit)}</Td>
          <Td numeric>{formatMass(visit.recoveredMass, unit)}</Td>
          <Td numeric>
            {formatPercent(visit.yield, 1)}
            {standing(visit) ? <span className="block text-xs text-ink-2">{standing(visit)}</span> : null}
          </Td>
        </tr>
      ))}
    </tbody>
  </Table>
);
