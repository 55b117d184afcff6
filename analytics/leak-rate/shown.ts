import { KG_PER_UNIT } from '@/lib/units';
import type { ApplianceCategory, LeakRateMethod, MassUnit } from '@/lib/vocabulary';
import type { ChargeAddition } from './addition-events';
import { calendarYears } from './calendar-years';
import type { ApplianceLeaks, ShownLeakRate, ShownRule } from './contract';
import { againstTrigger } from './judge';
import { type LeakRate, leakRates } from './leak-rates';
import { leakRuleVerdicts, type RuledRefrigerant, type RuleVerdict, triggerPercent } from './rules';
import { weighingUncertainty } from './uncertainty';

/** The method that is used while a site has chosen none. */
export const USUAL_METHOD: LeakRateMethod = 'annualizing';

const KG_PER: Record<MassUnit, number> = {
  ...KG_PER_UNIT,
  g: 0.001,
  oz: KG_PER_UNIT.lb / 16,
  'lb-oz': KG_PER_UNIT.lb / 16,
};
/** No scale that weighs an addition is coarser than this many of its unit: a person writes 17 for 17.0. */
const COARSEST: Record<MassUnit, number> = { lb: 0.1, kg: 0.1, oz: 1, 'lb-oz': 1, g: 1 };

const decimalsOf = (text: string): number => /\.(\d+)\s*$/.exec(text)?.[1]?.length ?? 0;

/** Standard uncertainty in kg of a mass as it was typed: its last digit is the step of the scale. */
export const enteredUncertaintyKg = (enteredMass: string, unit: MassUnit): number =>
  weighingUncertainty(Math.min(COARSEST[unit], 10 ** -decimalsOf(enteredMass)) * KG_PER[unit]);

const rounded = (value: number, digits: number): number => Number(value.toFixed(digits));

/** The rules that held for the appliance on a day. */
const holding = (verdicts: readonly RuleVerdict[], day: string): RuleVerdict[] =>
  verdicts.filter(({ rule, holds }) => holds === 'yes' && day >= rule.since);

const shownRate = (
  rate: LeakRate,
  day: string,
  verdicts: readonly RuleVerdict[],
  trigger: number | null,
): ShownLeakRate => {
  const held = holding(verdicts, day);
  const against = trigger !== null && held.length ? againstTrigger(rate, trigger) : null;
  return {
    percent: rounded(rate.percent, 2),
    low: rounded(Math.max(0, rate.percent - 2 * rate.uncertainty), 2),
    high: rounded(rate.percent + 2 * rate.uncertainty, 2),
    after: rate.after,
    leaksVerifiedOn: rate.leaksVerifiedOn,
    trigger: against && trigger,
    paragraphs: held.map(({ rule }) => rule.paragraph),
    above: against?.above ?? null,
    close: against?.close ?? false,
  };
};

/** What the rules and the methods need to know of an appliance. */
export type LeakingUnit = {
  fullChargeKg: number | null;
  category: ApplianceCategory | null;
  lightCommercial: boolean | null;
  refrigerant: RuledRefrigerant | null;
};

type Shown = Pick<ApplianceLeaks, 'events' | 'years' | 'rules' | 'trigger'>;

const NOTHING: Shown = { events: [], years: [], rules: [], trigger: null };

/** Rates, years and rules of one appliance as they are shown. Empty without a full charge: there is no rate then. */
export const shownLeaks = (unit: LeakingUnit, additions: readonly ChargeAddition[], method: LeakRateMethod): Shown => {
  const { fullChargeKg, category, refrigerant } = unit;
  const rated = leakRates(additions, fullChargeKg, method);
  if (!rated || fullChargeKg === null) return NOTHING;
  const verdicts = refrigerant ? leakRuleVerdicts({ ...unit, fullChargeKg }, refrigerant) : [];
  const trigger = triggerPercent(category);
  return {
    trigger,
    rules: verdicts.map(
      ({ rule, holds, why }): ShownRule => ({
        ...{ rule: rule.name, paragraph: rule.paragraph, since: rule.since },
        ...{ leastCharge: rounded(rule.leastChargeKg, 3), holds, why },
      }),
    ),
    events: rated.map(({ addedOn, additionIds, addedKg, countedKg, reasons, rate }) => ({
      ...{ addedOn, additionIds, reasons },
      added: rounded(addedKg, 3),
      counted: rounded(countedKg, 3),
      rate: rate && shownRate(rate, addedOn, verdicts, trigger),
    })),
    years: calendarYears(additions, fullChargeKg).map((year) => ({
      year: year.year,
      // Only a year in which a rule held is reported under it.
      chronic: year.chronic && holding(verdicts, `${year.year}-12-31`).length > 0,
      added: rounded(year.addedKg, 3),
      percent: rounded(year.percent, 2),
    })),
  };
};
