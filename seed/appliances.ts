import { yearOf } from './calendar';
import { EQUIPMENT, type EquipmentKind } from './equipment';
import type { Plan } from './plan';
import type { Random } from './random';
import { refrigerantOfNewUnit } from './refrigerant-mix';
import type { Site } from './sites';

/** A unit as its nameplate and its place tell. */
export type Appliance = {
  name: string;
  site: Site;
  equipment: EquipmentKind;
  refrigerant: string;
  /** Nameplate charge in whole ounces: plates print pounds and ounces. */
  nameplateOz: number;
  /** Charge added for a long line set. */
  addedOz: number;
  manufacturedOn: string;
  /** Loses charge again and again. */
  leaksAgain: boolean;
  gone: boolean;
};

/** A place for a unit; when one is scrapped the next stands there. */
export type Place = { site: Site; equipment: EquipmentKind; number: number; units: Appliance[] };

/** Rounds as plates are printed: fine on small units, whole pounds on large ones. */
const plateOunces = (pounds: number): number => {
  if (pounds < 1.5) return Math.max(3, Math.round(pounds * 32) / 2);
  if (pounds < 40) return Math.round(pounds * 4) * 4;
  return Math.round(pounds) * 16;
};

const makeUnit = (
  place: Omit<Place, 'units'>,
  generation: number,
  manufacturedOn: string,
  random: Random,
): Appliance => {
  const { equipment, site, number } = place;
  const pounds = equipment.medianChargeLb * Math.exp(random.normal(0, equipment.chargeSpread));
  const longLines = ['split', 'vrf', 'walkIn'].includes(equipment.kind) && random.chance(0.25);
  return {
    name: `${equipment.prefix}-${number}${generation ? String.fromCharCode(65 + generation) : ''}`,
    site,
    equipment,
    refrigerant: refrigerantOfNewUnit(equipment.kind, yearOf(manufacturedOn), random),
    nameplateOz: plateOunces(pounds),
    addedOz: longLines ? plateOunces(Math.max(1.5, pounds * random.between(0.06, 0.3))) : 0,
    manufacturedOn,
    leaksAgain: random.chance(0.06),
    gone: false,
  };
};

/** Puts a new unit where the last one stood. */
export const replaceUnit = (place: Place, month: string, random: Random): void => {
  const last = place.units.at(-1);
  if (last) last.gone = true;
  place.units.push(makeUnit(place, place.units.length, `${month}-01`, random));
};

/** The places for equipment and what stands there at the beginning. */
export const makePlaces = (plan: Plan, sites: readonly Site[], firstMonth: string, random: Random): Place[] =>
  EQUIPMENT.flatMap((equipment) => {
    const able = sites.filter(({ kind }) => equipment.sites.includes(kind));
    const numbers = new Map<Site, number>();
    return Array.from({ length: Math.max(1, Math.round(equipment.places * plan.scale)) }, (_, i): Place => {
      // The first round gives every site one, so that none stays without a unit where there are enough.
      const site = able[i] ?? random.pick(able);
      const number = (numbers.get(site) ?? 0) + 1;
      numbers.set(site, number);
      const made = yearOf(firstMonth) - random.integer(1, 17);
      const place = { site, equipment, number };
      return {
        ...place,
        units: [makeUnit(place, 0, `${made}-${String(random.integer(1, 12)).padStart(2, '0')}-01`, random)],
      };
    });
  });

/** The unit that stands at the place now. */
export const unitAt = (place: Place): Appliance => {
  const unit = place.units.at(-1);
  if (!unit) throw new Error('A place is made with a unit.');
  return unit;
};
