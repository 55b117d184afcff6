import type { ApplianceCategory, JobType } from '@/lib/vocabulary';
import type { Random } from '../random';

/** A kind of appliance: its share of the jobs, its charge in pounds (log-normal), what it runs on. */
export type Kind = {
  name: 'small' | 'split' | 'rooftop' | 'vrf' | 'walk_in' | 'rack' | 'chiller';
  category: ApplianceCategory;
  season: 'cooling' | 'refrigeration';
  share: number;
  medianLb: number;
  spread: number;
  isLarge: boolean;
};

const kind = (
  name: Kind['name'],
  category: ApplianceCategory,
  share: number,
  medianLb: number,
  spread: number,
): Kind => ({
  name,
  category,
  season: category === 'comfort_cooling' ? 'cooling' : 'refrigeration',
  share,
  medianLb,
  spread,
  isLarge: medianLb >= 100,
});

export const KINDS: readonly Kind[] = [
  kind('small', 'small_appliance', 0.1, 0.7, 0.5),
  kind('split', 'comfort_cooling', 0.44, 7, 0.33),
  kind('rooftop', 'comfort_cooling', 0.22, 17, 0.45),
  kind('vrf', 'comfort_cooling', 0.05, 34, 0.4),
  kind('walk_in', 'commercial_refrigeration', 0.11, 13, 0.5),
  kind('rack', 'commercial_refrigeration', 0.035, 380, 0.4),
  kind('chiller', 'comfort_cooling', 0.05, 450, 0.55),
];

export const JOB_SHARES: Record<JobType, number> = { disposal: 0.5, service: 0.26, repair: 0.18, conversion: 0.06 };

const logistic = (x: number) => 1 / (1 + Math.exp(-x));

/** What a unit of this kind runs on when met in this year (with fraction). */
export const drawRefrigerant = (kind: Kind, year: number, random: Random): string => {
  const handover = logistic((year - 2020) / 2);
  if (kind.name === 'chiller')
    return random.pick(['R-134a', 'R-123', 'R-22', 'R-513A'], (name) =>
      name === 'R-134a' ? 0.52 : name === 'R-123' ? 0.32 : name === 'R-22' ? 0.2 * (1 - handover) : 0.1 * handover,
    );
  if (kind.name === 'small') {
    if (random.chance(0.008)) return 'R-12';
    return random.chance(0.5) ? 'R-134a' : random.chance(handover) ? 'R-410A' : 'R-22';
  }
  if (kind.name === 'walk_in' || kind.name === 'rack') {
    if (random.chance(0.03)) return 'R-507A';
    if (kind.name === 'walk_in' && random.chance(0.15)) return 'R-134a';
    if (random.chance(0.5 * (1 - handover))) return 'R-22';
    return random.chance(0.5 * handover) ? 'R-448A' : 'R-404A';
  }
  if (random.chance(0.018)) return 'R-407C';
  if (year >= 2024 && random.chance(0.16 * Math.min(1, (year - 2024) / 2.5))) return random.pick(['R-32', 'R-454B']);
  return random.chance(handover) ? 'R-410A' : 'R-22';
};

/** Nameplate as a plate gives it: hundredths of a pound on small units, whole pounds on plant. */
export const drawNameplateLb = (kind: Kind, random: Random): number => {
  const lb = kind.medianLb * Math.exp(random.normal(0, kind.spread));
  const places = lb < 2 ? 2 : lb < 100 ? 1 : 0;
  return Math.max(0.1, Number(lb.toFixed(places)));
};
