import { massToKg } from '@/lib/units';
import type { ApplianceCategory } from '@/lib/vocabulary';
import { isHfc, isOzoneDepleting } from './regulated-substances';

/** What the rules ask about a refrigerant. */
export type RuledRefrigerant = {
  gwpAr4: number;
  /** Designations of what it is made of. */
  components: readonly string[];
};

/** What the rules ask about an appliance. `lightCommercial` null: nobody has said. */
export type RuledAppliance = {
  fullChargeKg: number;
  category: ApplianceCategory | null;
  /** Of the residential and light commercial air-conditioning and heat pump subsector. */
  lightCommercial: boolean | null;
};

export type LeakRuleName = 'ozone' | 'hfc';

/** A leak repair rule: where it stands, from which day it is judged here, and from which full charge on it holds. */
export type LeakRule = {
  name: LeakRuleName;
  paragraph: string;
  since: string;
  leastCharge: string;
  leastChargeKg: number;
};

const pounds = (lb: string): number => Number(massToKg(lb, 'lb'));

export const LEAK_RULES: Record<LeakRuleName, LeakRule> = {
  // Since this day HFCs stand outside of it: 85 FR 14150.
  ozone: {
    name: 'ozone',
    paragraph: '40 CFR 82.157',
    since: '2020-04-10',
    leastCharge: '50',
    leastChargeKg: pounds('50'),
  },
  // 89 FR 82682.
  hfc: { name: 'hfc', paragraph: '40 CFR 84.106', since: '2026-01-01', leastCharge: '15', leastChargeKg: pounds('15') },
};

/** Above so many percent leaks must be repaired, the same in both rules; null for an unstated category: 40 CFR 82.157(c). */
export const triggerPercent = (category: ApplianceCategory | null): number | null => {
  if (category === null) return null;
  if (category === 'commercial_refrigeration') return 20;
  return category === 'industrial_process' ? 30 : 10;
};

/** A substitute counts from a GWP above this one: 42 USC 7675(c), 40 CFR 84.106. */
const GWP_ABOVE = 53;

/** Why a rule holds for an appliance or not, or what must be said first. */
export type RuleVerdict = { rule: LeakRule; holds: 'yes' | 'no' | 'ask'; why: RuleReason };
export type RuleReason = 'in_scope' | 'refrigerant' | 'charge' | 'light_commercial' | 'light_commercial_unstated';

const ozoneVerdict = (appliance: RuledAppliance, refrigerant: RuledRefrigerant): RuleVerdict => {
  const rule = LEAK_RULES.ozone;
  if (!refrigerant.components.some(isOzoneDepleting)) return { rule, holds: 'no', why: 'refrigerant' };
  if (appliance.fullChargeKg < rule.leastChargeKg) return { rule, holds: 'no', why: 'charge' };
  return { rule, holds: 'yes', why: 'in_scope' };
};

const hfcVerdict = (appliance: RuledAppliance, refrigerant: RuledRefrigerant): RuleVerdict => {
  const rule = LEAK_RULES.hfc;
  const substitute = !refrigerant.components.some(isOzoneDepleting) && refrigerant.gwpAr4 > GWP_ABOVE;
  if (!substitute && !refrigerant.components.some(isHfc)) return { rule, holds: 'no', why: 'refrigerant' };
  if (appliance.fullChargeKg < rule.leastChargeKg) return { rule, holds: 'no', why: 'charge' };
  if (appliance.category !== 'comfort_cooling') return { rule, holds: 'yes', why: 'in_scope' };
  if (appliance.lightCommercial === null) return { rule, holds: 'ask', why: 'light_commercial_unstated' };
  return appliance.lightCommercial
    ? { rule, holds: 'no', why: 'light_commercial' }
    : { rule, holds: 'yes', why: 'in_scope' };
};

/**
 * Whether each leak repair rule holds for an appliance: 40 CFR part 82 subpart F from 50 lb of an ozone-depleting
 * refrigerant, 40 CFR part 84 subpart C from 15 lb of an HFC or of a substitute with a GWP above 53, which leaves out the
 * residential and light commercial air-conditioning and heat pump subsector. Throws RangeError for a full charge that is
 * not above zero.
 */
export const leakRuleVerdicts = (appliance: RuledAppliance, refrigerant: RuledRefrigerant): RuleVerdict[] => {
  if (!(appliance.fullChargeKg > 0)) throw new RangeError(`No full charge: ${appliance.fullChargeKg} kg`);
  return [ozoneVerdict(appliance, refrigerant), hfcVerdict(appliance, refrigerant)];
};
