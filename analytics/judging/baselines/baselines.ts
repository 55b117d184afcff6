import { fitArrivals } from '../arrivals/fit';
import type { ArrivalMixture } from '../arrivals/mixture';
import { jobKey, kindKey } from '../kinds';
import { type Neighbours, neighboursOf } from '../neighbours/neighbours';
import { fitScaleSteps, type ScaleSteps } from '../readings/scale-steps';
import { fitVacuumGroups, readVacuum, type VacuumGroups } from '../readings/vacuum-groups';
import type { JudgedRecord } from '../record';
import { doubledOf } from '../rules/duplicate';
import type { JudgingSettings } from '../settings';
import { fitHabits, type Habits } from './habits';
import { fitNameplateSizes, type NameplateSizes } from './nameplate-sizes';
import { fitPeers, type PeerTable } from './peers';
import { fitTicketDates, type TicketDates } from './ticket-dates';

/** All that a company's records are judged by. Plain data: stored once, it judges single records later on. */
export type Baselines = {
  records: number;
  peers: PeerTable;
  arrivals: ArrivalMixture;
  vacuums: VacuumGroups;
  steps: ScaleSteps;
  sizes: NameplateSizes;
  habits: Habits;
  tickets: TicketDates;
};

/** Fits the baselines to what counts: entry errors, doubled tickets and impossible yields are left out. */
export const fitBaselines = (
  records: readonly JudgedRecord[],
  settings: JudgingSettings,
  neighbours: Neighbours = neighboursOf(records),
): Baselines => {
  const counted = records.filter(
    (record) =>
      !record.isExcluded &&
      record.recoveredMassKg <= settings.mostYield * record.fullChargeKg &&
      doubledOf(neighbours, record) === null,
  );
  const vacuums = fitVacuumGroups(counted, settings);
  const pulls = counted.map((record) => {
    const vacuum = readVacuum(vacuums, record, record.fullChargeKg, settings);
    return {
      technicianId: record.technicianId,
      kind: kindKey(record, record.fullChargeKg, settings),
      job: jobKey(record),
      recoveryYield: record.recoveredMassKg / record.fullChargeKg,
      vacuum: vacuum && { z: vacuum.z, usual: vacuum.usualKpa / vacuum.spreadKpa },
    };
  });
  return {
    records: counted.length,
    peers: fitPeers(counted, settings),
    arrivals: fitArrivals(pulls),
    vacuums,
    steps: fitScaleSteps(counted, settings),
    sizes: fitNameplateSizes(counted),
    habits: fitHabits(counted, settings),
    tickets: fitTicketDates(counted),
  };
};
