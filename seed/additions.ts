import { Temporal } from 'temporal-polyfill';
import type { AdditionReason, JobType } from '@/lib/vocabulary';
import type { Appliance, Place } from './appliances';
import { fullChargeLb, type Pull } from './pull';
import type { Random } from './random';

/** Refrigerant put into a unit, as it truly was. */
export type DemoAddition = {
  addedOn: string;
  site: string;
  appliance: string;
  /** To a tenth of a pound, as it was weighed in. */
  addedLb: number;
  reason: AdditionReason;
  leaksVerifiedOn: string | null;
};

/** From this full charge on the company keeps additions apart: the least that 40 CFR 84.106 asks about. */
const KEPT_FROM_LB = 15;
/** Share of leak additions of which nobody wrote down why. */
const SAYS_NOTHING = 0.05;

const tenths = (lb: number): number => Math.round(lb * 10) / 10;
const daysLater = (day: string, days: number): string => Temporal.PlainDate.from(day).add({ days }).toString();

/** Keeps what went into units while the years are played; draws from a source of its own. */
export const additionsBook = (endMonth: string, random: Random) => {
  const additions: DemoAddition[] = [];
  const lastDay = Temporal.PlainYearMonth.from(endMonth)
    .toPlainDate({ day: 1 })
    .add({ months: 1 })
    .subtract({ days: 1 });
  const write = (unit: Appliance, addition: Omit<DemoAddition, 'site' | 'appliance'>) => {
    if (fullChargeLb(unit) < KEPT_FROM_LB || addition.addedLb <= 0) return;
    additions.push({ ...addition, site: unit.site.name, appliance: unit.name });
  };

  return {
    additions,
    /** A unit that came short is filled up again once it is mended, on the day of the job or soon after. */
    afterPull: (unit: Appliance, job: { type: JobType; day: string }, pull: Pull): void => {
      if (!pull.shortOnArrival || job.type === 'disposal') return;
      const missing = fullChargeLb(unit) - pull.recoveredLb / pull.efficiency;
      const tested = daysLater(job.day, random.integer(2, 20));
      const isTested = job.type === 'repair' && random.chance(0.7) && tested <= lastDay.toString();
      write(unit, {
        addedOn: job.day,
        addedLb: tenths(missing),
        reason: job.type === 'conversion' ? 'retrofit' : random.chance(SAYS_NOTHING) ? 'unknown' : 'leak_top_up',
        leaksVerifiedOn: isTested ? tested : null,
      });
    },
    /** The first charge of a unit that was put up within the years of the company's records. */
    atInstall: ({ units }: Place, firstMonth: string): void => {
      for (const unit of units)
        if (unit.manufacturedOn.slice(0, 7) > firstMonth)
          write(unit, {
            addedOn: unit.manufacturedOn,
            addedLb: tenths(fullChargeLb(unit)),
            reason: 'initial_charge',
            leaksVerifiedOn: null,
          });
    },
  };
};
export type AdditionsBook = ReturnType<typeof additionsBook>;
