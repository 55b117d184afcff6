import type { CertificationType, MassUnit } from '@/lib/vocabulary';
import { FAMILY_NAMES, GIVEN_NAMES } from './names';
import { BRANCH_SHARES, type Plan } from './plan';
import type { Random } from './random';
import type { Habit } from './truth';

/** Somebody of the crew: how he works is planted, and only tests know it. */
export type Technician = {
  name: string;
  branch: string;
  habit: Habit;
  /** Logit of the efficiency above or below the crew's. */
  skill: number;
  /** Share of the jobs that are broken off early. */
  stopsEarly: number;
  fromMonth: string;
  /** Last month with the company; null who is still there. */
  untilMonth: string | null;
  /** From this day on a coached technician works like the others. */
  coachedOn: string | null;
  unit: Extract<MassUnit, 'lb' | 'lb-oz' | 'kg'>;
  scaleStep: number;
  certification: CertificationType;
  cardNumber: string;
};

/** Who is planted, in the order in which the crew is made; everybody after these is ordinary. */
const PLANTED: readonly Habit[] = [
  'cuts_hold_short',
  'cuts_hold_short',
  'cuts_hold_short',
  'coached',
  'leak_specialist',
  'large_plant',
  'drifting_scale',
];
const STOPS_EARLY: Partial<Record<Habit, number>> = { cuts_hold_short: 0.3, coached: 0.38, leak_specialist: 0.004 };

/** How long before the end the coached technician was coached. */
const COACHED_MONTHS_AGO = 20;

/** The crew, the planted ones spread over the branches. A company of fewer than ten has ordinary people only. */
export const makeTechnicians = (plan: Plan, months: readonly string[], random: Random): Technician[] => {
  const given = [...GIVEN_NAMES];
  const family = [...FAMILY_NAMES];
  const take = (names: string[]) => names.splice(random.integer(0, names.length - 1), 1)[0] ?? 'Nobody';
  const first = months[0] ?? plan.endMonth;
  const coachedMonth = months.at(-COACHED_MONTHS_AGO) ?? first;
  return Array.from({ length: plan.technicians }, (_, i): Technician => {
    const planted = plan.technicians < 10 ? undefined : PLANTED[i];
    const joined = planted || random.chance(0.55) ? first : random.pick(months.slice(6, -4));
    const lastMonths = months.slice(-60, -6).filter((month) => month > joined);
    const left = !planted && lastMonths.length && random.chance(0.18) ? random.pick(lastMonths) : null;
    const habit: Habit = planted ?? (joined > first ? 'newcomer' : 'ordinary');
    return {
      name: `${take(given)} ${take(family)}`,
      branch: random.pick(plan.branches, (b) =>
        planted
          ? Number(plan.branches.indexOf(b) === i % plan.branches.length)
          : (BRANCH_SHARES[plan.branches.indexOf(b)] ?? 1),
      ),
      habit,
      skill: habit === 'leak_specialist' ? 0.35 : random.normal(0, 0.18),
      stopsEarly: STOPS_EARLY[habit] ?? random.between(0.003, 0.012),
      fromMonth: joined,
      untilMonth: left,
      coachedOn: habit === 'coached' ? `${coachedMonth}-12` : null,
      // One writes pounds and ounces, one kilograms, as people do who learned it so.
      unit: i === 9 ? 'lb-oz' : i === 11 ? 'kg' : 'lb',
      scaleStep: random.pick([0.1, 0.1, 0.1, 0.2]),
      certification: habit === 'newcomer' && random.chance(0.3) ? 'II' : 'universal',
      cardNumber: `608-${random.integer(100000, 999999)}`,
    };
  });
};

/** Who of the crew works in the month. */
export const atWork = (crew: readonly Technician[], month: string): Technician[] =>
  crew.filter((t) => t.fromMonth <= month && (t.untilMonth === null || month <= t.untilMonth));
