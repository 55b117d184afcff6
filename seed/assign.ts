import type { JobType } from '@/lib/vocabulary';
import type { Appliance } from './appliances';
import { isLargePlant } from './equipment';
import type { Random } from './random';
import type { Technician } from './technicians';

/** How readily somebody is sent to a job of his own branch, and of another one. */
type Calls = { here: number; away: number };

const callsFor = ({ habit }: Technician, unit: Appliance, job: JobType): Calls => {
  if (habit === 'large_plant') return isLargePlant(unit.equipment) ? { here: 25, away: 9 } : { here: 0.25, away: 0 };
  if (habit === 'leak_specialist') {
    if (unit.leaksAgain) return { here: 9, away: 1.2 };
    return { here: job === 'repair' ? 1.8 : 0.35, away: 0 };
  }
  return { here: 1, away: 0.004 };
};

/** Who is sent: mostly somebody of the branch; specialists get what they are good at. */
export const assign = (crew: readonly Technician[], unit: Appliance, job: JobType, random: Random): Technician =>
  random.pick(crew, (technician) => {
    const { here, away } = callsFor(technician, unit, job);
    return technician.branch === unit.site.branch ? here : away;
  });
