import { CATALOGUE } from '@/db/catalogue/refrigerants';
import type { Random } from './random';

/** A recovery cylinder and what it holds while the tickets are written. Masses in pounds. */
export type Cylinder = {
  serial: string;
  branch: string;
  refrigerant: string;
  waterCapacityLb: number;
  tareLb: number;
  specification: string;
  requalifiedOn: string;
  contentLb: number;
  /** A second refrigerant got in: nothing more goes in, the reclaimer charges for it. */
  mixed: boolean;
};

type Size = { fits: (chargeLb: number) => boolean; waterCapacityLb: number; tareLb: number; specification: string };
const SIZES: readonly Size[] = [
  { fits: (lb) => lb < 4, waterCapacityLb: 26.2, tareLb: 17, specification: 'DOT-4BA400' },
  { fits: (lb) => lb <= 32, waterCapacityLb: 47.6, tareLb: 27.5, specification: 'DOT-4BA400' },
  { fits: () => true, waterCapacityLb: 1000, tareLb: 380, specification: 'DOT-4BW400' },
];

const WATER_DENSITY_25C = 997.05;
const gravity = (refrigerant: string) =>
  (CATALOGUE.find(({ designation }) => designation === refrigerant)?.liquidDensityKgPerM3 ?? WATER_DENSITY_25C) /
  WATER_DENSITY_25C;

/** Largest net content: 0.8 x water capacity x specific gravity at 77 °F (AHRI Guideline K). */
export const fillLimitLb = ({
  waterCapacityLb,
  refrigerant,
}: Pick<Cylinder, 'waterCapacityLb' | 'refrigerant'>): number => 0.8 * waterCapacityLb * gravity(refrigerant);

/** What stays in a cylinder that comes back from the reclaimer. */
const heel = (size: Cylinder, random: Random) => random.between(0, 0.003) * size.waterCapacityLb;

/** The company's cylinders: who needs one takes an empty one of its branch or gets a new one. */
export const cylinderPool = (prefix: string, random: Random) => {
  const all: Cylinder[] = [];
  const away: { cylinder: Cylinder; backOn: string }[] = [];

  const make = (branch: string, refrigerant: string, chargeLb: number, day: string): Cylinder => {
    const size = SIZES.find(({ fits }) => fits(chargeLb)) ?? SIZES[2];
    if (!size) throw new Error('The largest size fits everything.');
    const tested = Number(day.slice(0, 4)) - random.integer(0, 4);
    const cylinder = {
      serial: `${prefix}-${String(all.length + 1).padStart(4, '0')}`,
      branch,
      refrigerant,
      waterCapacityLb: size.waterCapacityLb,
      tareLb: Math.round(size.tareLb * (1 + random.normal(0, 0.012)) * 10) / 10,
      specification: size.specification,
      requalifiedOn: `${tested}-${String(random.integer(1, 12)).padStart(2, '0')}-01`,
      contentLb: 0,
      mixed: false,
    };
    all.push(cylinder);
    return cylinder;
  };

  return {
    all,
    /** An empty cylinder that this charge fits into. */
    take: (branch: string, refrigerant: string, chargeLb: number, day: string): Cylinder => {
      const found = away.findIndex(
        ({ cylinder, backOn }) =>
          backOn <= day &&
          cylinder.branch === branch &&
          cylinder.refrigerant === refrigerant &&
          fillLimitLb(cylinder) > chargeLb * 1.2,
      );
      const back = found < 0 ? undefined : away.splice(found, 1)[0]?.cylinder;
      const cylinder = back ?? make(branch, refrigerant, chargeLb, day);
      cylinder.contentLb = back ? heel(cylinder, random) : 0;
      cylinder.mixed = false;
      return cylinder;
    },
    /** Sends a cylinder away; it is back, empty, from that day on. */
    send: (cylinder: Cylinder, backOn: string) => away.push({ cylinder, backOn }),
  };
};
export type CylinderPool = ReturnType<typeof cylinderPool>;
