import type { Random } from '../random';
import type { Kind } from './kinds';
import { monthOfYear, monthsBetween } from './months';
import type { SimulationOptions } from './options';

/** How a company's volume moves; drawn once a company. */
export type Climate = {
  coolingAmplitude: number;
  refrigerationAmplitude: number;
  growthPerYear: number;
  monthNoiseShape: number;
  pandemicDrop: number;
  lostMonth: string | null;
  /** Years by which the mix of refrigerants runs ahead or behind. */
  mixShiftYears: number;
};

export const drawClimate = (months: readonly string[], random: Random): Climate => ({
  coolingAmplitude: random.between(0.4, 0.75),
  refrigerationAmplitude: random.between(0.04, 0.16),
  growthPerYear: random.between(-0.01, 0.07),
  monthNoiseShape: random.between(14, 40),
  pandemicDrop: random.between(0.1, 0.35),
  lostMonth: random.chance(1 / 3) ? random.pick(months.slice(12, -12)) : null,
  mixShiftYears: random.between(-0.8, 0.8),
});

const PANDEMIC = ['2020-03', '2020-04', '2020-05', '2020-06'];

/** Relative volume of a kind of appliance in each month, without noise. */
const shape = (kind: Kind, month: string, year: number, climate: Climate): number => {
  const angle = (2 * Math.PI * (monthOfYear(month) - 6.4)) / 12;
  const amplitude = kind.season === 'cooling' ? climate.coolingAmplitude : climate.refrigerationAmplitude;
  const winter = kind.season === 'cooling' && [0, 11].includes(monthOfYear(month)) ? 0.09 : 0;
  const drop = PANDEMIC.includes(month) ? 1 - climate.pandemicDrop : 1;
  return Math.exp(amplitude * Math.cos(angle) + winter + climate.growthPerYear * year) * drop;
};

/** How many jobs of each kind each month brings; about `size` together. */
export const drawVolumes = (
  kinds: readonly Kind[],
  months: readonly string[],
  options: SimulationOptions,
  climate: Climate,
  random: Random,
): { month: string; kind: Kind; jobs: number }[] => {
  const cells = kinds.flatMap((kind) =>
    months.map((month) => ({
      month,
      kind,
      weight: kind.share * shape(kind, month, monthsBetween(months[0] ?? month, month) / 12, climate),
    })),
  );
  const total = cells.reduce((sum, { weight }) => sum + weight, 0);
  return cells.map(({ month, kind, weight }) => {
    const noise = random.gamma(climate.monthNoiseShape) / climate.monthNoiseShape;
    const mean = (options.size * weight * noise) / total;
    return { month, kind, jobs: month === climate.lostMonth ? 0 : random.poisson(mean) };
  });
};
