import type { MassUnit, VacuumUnit } from '@/lib/vocabulary';
import { cleanText } from './text';

const MASS_WORDS: Record<MassUnit, readonly string[]> = {
  lb: ['lb', 'lbs', 'pound', 'pounds'],
  oz: ['oz', 'ozs', 'ounce', 'ounces'],
  'lb-oz': ['lb oz', 'lbs oz', 'lb & oz', 'lbs & oz', 'pounds ounces', 'pounds and ounces', 'lb and oz', 'lbs and oz'],
  kg: ['kg', 'kgs', 'kilo', 'kilos', 'kilogram', 'kilograms', 'kilogramme', 'kilogrammes'],
  g: ['g', 'gram', 'grams', 'gramme', 'grammes'],
};

// Bare psi, mmHg and kPa are left out on purpose: they do not say from where the pressure is counted.
const VACUUM_WORDS: Record<VacuumUnit, readonly string[]> = {
  inhg: ['inhg', 'in hg', 'inches hg', 'inch hg', 'inches of mercury', '"hg', 'inhg vac', 'inhg vacuum', 'in hg vac'],
  psig: ['psig', 'psi g', 'psi gauge'],
  mmhg_abs: ['mmhg abs', 'mmhg absolute', 'mm hg abs', 'mm hg absolute', 'mmhga', 'torr'],
  kpa_abs: ['kpa abs', 'kpa absolute', 'kpaa', 'kpa a'],
  micron: ['micron', 'microns', 'um hg', 'µm hg', 'μm hg', 'umhg', 'µmhg', 'μmhg'],
};

const wordMap = <Unit extends string>(words: Record<Unit, readonly string[]>): Map<string, Unit> =>
  // Object.entries widens the keys to string; the record's own type names them.
  new Map((Object.entries(words) as [Unit, readonly string[]][]).flatMap(([unit, list]) => list.map((w) => [w, unit])));

const MASS_UNIT_OF = wordMap(MASS_WORDS);
const VACUUM_UNIT_OF = wordMap(VACUUM_WORDS);

const unitWords = (text: string): string =>
  cleanText(text)
    .toLowerCase()
    .replace(/[.()[\]]/g, '')
    .replace(/[\s_/+-]+/g, ' ')
    .trim();

/** The unit of mass a cell or header names, or null: `Lbs.`, `pounds`, `lb/oz`. */
export const massUnitOf = (text: string): MassUnit | null => MASS_UNIT_OF.get(unitWords(text)) ?? null;

/** The unit of vacuum a cell or header names, or null: `in. Hg`, `microns`; bare `psi`, `mmHg`, `kPa` say too little. */
export const vacuumUnitOf = (text: string): VacuumUnit | null => VACUUM_UNIT_OF.get(unitWords(text)) ?? null;

const longestFirst = (words: Iterable<string>) => [...words].sort((a, b) => b.length - a.length);
const MASS_LIST = longestFirst(MASS_UNIT_OF.keys());
const VACUUM_LIST = longestFirst(VACUUM_UNIT_OF.keys());

const splitUnit = <Unit>(header: string, list: string[], units: Map<string, Unit>) => {
  const words = unitWords(header);
  for (const word of list) {
    const rest = words.startsWith(`${word} `)
      ? words.slice(word.length + 1)
      : words.endsWith(` ${word}`)
        ? words.slice(0, -word.length - 1)
        : null;
    const unit = units.get(word);
    if (rest && unit !== undefined) return { rest: rest.replace(/ (?:in|of)$|^(?:in|of) /, ''), unit };
  }
  return null;
};

/** Splits a header such as `Nameplate (oz)` or `Lbs recovered` into its words and the mass unit; null without one. */
export const splitMassUnit = (header: string) => splitUnit(header, MASS_LIST, MASS_UNIT_OF);

/** The same for `Final vacuum (microns)`. */
export const splitVacuumUnit = (header: string) => splitUnit(header, VACUUM_LIST, VACUUM_UNIT_OF);
