import { CATALOGUE } from '@/db/catalogue/refrigerants';
import type { JobType, VacuumUnit } from '@/lib/vocabulary';
import type { Appliance } from './appliances';
import { monthOfYear } from './calendar';
import type { Random } from './random';
import type { Technician } from './technicians';

/** What truly happened at the appliance, before anybody wrote it down. */
export type Pull = {
  recoveredLb: number;
  /** Share of what was in the system that came out. */
  efficiency: number;
  stoppedEarly: boolean;
  shortOnArrival: boolean;
  finalVacuum: number;
  vacuumUnit: VacuumUnit;
  holdMinutes: number;
  holdRise: number;
};

export const fullChargeLb = ({ nameplateOz, addedOz }: Appliance): number => (nameplateOz + addedOz) / 16;

const LOST: Record<JobType, { leaked: number; empty: number }> = {
  service: { leaked: 0.07, empty: 0.01 },
  repair: { leaked: 0.27, empty: 0.04 },
  conversion: { leaked: 0.1, empty: 0.01 },
  disposal: { leaked: 0.16, empty: 0.05 },
};

/** Share of the full charge still in the system when somebody came. */
const chargeOnArrival = (unit: Appliance, job: JobType, random: Random): { share: number; short: boolean } => {
  const { leaked, empty } = unit.leaksAgain ? { leaked: 0.66, empty: 0.08 } : LOST[job];
  if (random.chance(empty)) return { share: random.beta(1.1, 14), short: true };
  if (random.chance(leaked)) return { share: random.beta(3.2, 2.2), short: true };
  return { share: 1.04 * random.beta(52, 3.2), short: false };
};

const logistic = (x: number) => 1 / (1 + Math.exp(-x));

/** Logit of a middling pull's efficiency: 0.955. */
const CREW = 3.05;
/** A newcomer starts this much lower and learns over some 30 jobs. */
const BEGINNER = { drop: 0.7, jobs: 30 };

/**
 * The vacuum the trade pulls to, a little past 40 CFR 82.156(a) Table 1: inches of mercury, on low-pressure appliances
 * millimetres absolute.
 */
const usualVacuum = (unit: Appliance): { reading: number; unit: VacuumUnit } => {
  if (unit.equipment.category === 'small_appliance') return { reading: 6, unit: 'inhg' };
  const large = fullChargeLb(unit) >= 200;
  switch (CATALOGUE.find(({ designation }) => designation === unit.refrigerant)?.pressureClass) {
    case 'low':
      return { reading: 21, unit: 'mmhg_abs' };
    case 'medium':
      return { reading: large ? 17 : 12, unit: 'inhg' };
    default:
      return { reading: large ? 12 : 10.5, unit: 'inhg' };
  }
};

const stopsEarly = (technician: Technician, day: string): number =>
  technician.coachedOn !== null && day >= technician.coachedOn ? 0.012 : technician.stopsEarly;

/** One pull by this technician; `jobsBefore` is how many he did before with the company. */
export const pullDown = (
  unit: Appliance,
  job: { type: JobType; day: string; technician: Technician; jobsBefore: number },
  random: Random,
): Pull => {
  const { technician, day } = job;
  const arrival = chargeOnArrival(unit, job.type, random);
  const stoppedEarly = random.chance(stopsEarly(technician, day));
  const learning = technician.habit === 'newcomer' ? BEGINNER.drop * Math.exp(-job.jobsBefore / BEGINNER.jobs) : 0;
  // Cold oil and a cold cylinder give refrigerant back slowly.
  const cold = [11, 0, 1].includes(monthOfYear(day.slice(0, 7))) ? 0.12 : 0;
  const thorough = logistic(CREW + technician.skill - learning - cold + random.normal(0, 0.4));
  const efficiency = stoppedEarly ? thorough * random.between(0.3, 0.75) : thorough;

  const usual = usualVacuum(unit);
  const deep = usual.reading + random.normal(0, 0.8) + 8 * (thorough - 0.95);
  const shallow =
    usual.unit === 'mmhg_abs' ? usual.reading + random.between(60, 260) : usual.reading * random.between(0, 0.5);
  return {
    recoveredLb: fullChargeLb(unit) * arrival.share * efficiency,
    efficiency,
    stoppedEarly,
    shortOnArrival: arrival.short,
    finalVacuum: Math.max(0, stoppedEarly ? shallow : usual.unit === 'mmhg_abs' ? Math.min(deep, 25) : deep),
    vacuumUnit: usual.unit,
    holdMinutes: stoppedEarly
      ? random.integer(0, 2)
      : random.integer(fullChargeLb(unit) > 100 ? 15 : 5, fullChargeLb(unit) > 100 ? 45 : 20),
    holdRise: stoppedEarly ? random.between(0, 1) : Math.abs(random.normal(0.3, 0.3)),
  };
};
