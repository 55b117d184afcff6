import type { JobType } from '@/lib/vocabulary';
import type { Appliance } from './appliances';
import { isLargePlant } from './equipment';
import type { Random } from './random';
import type { Technician } from './technicians';

/** Who is sent: mostly somebody of the branch; specialists get what they are good at. */
export const assign = (crew: readonly Technician[], unit: Appliance, job: JobType, random: Random): Technician =>
  random.pick(crew, (technician) => {
    const here = technician.branch === unit.site.branch;
    if (technician.habit === 'large_plant') return isLargePlant(unit.equipment) ? (here ? 25 : 9) : here ? 0.25 : 0;
    if (technician.habit === 'leak_specialist' && (unit.leaksAgain || job === 'repair'))
      return here ? (unit.leaksAgain ? 5 : 1.6) : unit.leaksAgain ? 0.8 : 0;
    return here ? 1 : 0.004;
  });
