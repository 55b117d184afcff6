import type { Random } from '../random';
import type { SimulatedFault } from './options';
import type { SimulatedRow } from './row';
import { plain } from './weighing';

type Slip = Exclude<SimulatedFault, 'stopped_early' | 'duplicate'>;

const SHARES: Record<Slip, number> = {
  decimal_low: 0.2,
  decimal_high: 0.06,
  kg_as_lb: 0.15,
  oz_as_lb: 0.08,
  swapped_weights: 0.13,
  zero_recovered: 0.12,
  nameplate_x10: 0.18,
  nameplate_digits_swapped: 0.08,
};
const SLIPS = Object.keys(SHARES) as Slip[];
/** Share of the slips that a row written twice is. */
const DOUBLED = 0.14;
/** Somebody who types the mass wrongly often works out the end weight from it. */
const END_FOLLOWS = 0.6;

const withMass = (row: SimulatedRow, lb: number, random: Random): Partial<SimulatedRow> => {
  const recovered_mass = plain(lb, 2);
  if (!random.chance(END_FOLLOWS)) return { recovered_mass };
  return { recovered_mass, end_weight: plain(Number(row.start_weight) + Number(recovered_mass), 2) };
};

const swapFirstDigits = (text: string): string | null => {
  const digits = text.replace('.', '');
  if (!/^\d\d/.test(text) || digits.length < 2) return null;
  const swapped = text.replace(/^(\d)(\d)/, '$2$1');
  return swapped === text || swapped.startsWith('0') ? null : swapped;
};

const change = (slip: Slip, row: SimulatedRow, random: Random): Partial<SimulatedRow> | null => {
  const lb = Number(row.recovered_mass);
  switch (slip) {
    case 'decimal_low':
      return lb > 0 ? withMass(row, lb / 10, random) : null;
    case 'decimal_high':
      return lb > 0 ? withMass(row, lb * 10, random) : null;
    case 'kg_as_lb':
      return lb > 0 ? withMass(row, lb * 0.45359237, random) : null;
    case 'oz_as_lb':
      return lb > 0 ? withMass(row, lb * 16, random) : null;
    case 'zero_recovered':
      return lb > 0 ? withMass(row, 0, random) : null;
    case 'swapped_weights':
      return lb > 0 ? { start_weight: row.end_weight, end_weight: row.start_weight, recovered_mass: plain(-lb) } : null;
    case 'nameplate_x10':
      return { nameplate_charge: plain(Number(row.nameplate_charge) * 10) };
    case 'nameplate_digits_swapped': {
      const swapped = swapFirstDigits(row.nameplate_charge);
      return swapped ? { nameplate_charge: swapped } : null;
    }
  }
};

/** What becomes of a row once it is written down: itself, spoilt by one slip, or itself twice. */
export const writeDown = (
  row: SimulatedRow,
  slipShare: number,
  random: Random,
): { row: SimulatedRow; fault: SimulatedFault | null }[] => {
  if (!random.chance(slipShare)) return [{ row, fault: null }];
  if (random.chance(DOUBLED))
    return [
      { row, fault: null },
      { row: { ...row }, fault: 'duplicate' },
    ];
  const slip = random.pick(SLIPS, (name) => SHARES[name]);
  const changed = change(slip, row, random);
  return [changed ? { row: { ...row, ...changed }, fault: slip } : { row, fault: null }];
};
