import type { JobType } from '@/lib/vocabulary';
import type { Random } from '../random';
import { drawNameplateLb, drawRefrigerant, type Kind } from './kinds';

export type Unit = { name: string; site: string; kind: Kind; refrigerant: string; nameplateLb: number };

/** A unit that is not scrapped is met again this often rather than a new one. */
const COMES_BACK = 0.28;

/** Which unit a job is done on: one met before, or a new one at some site. */
export const unitBook = (sites: number, random: Random) => {
  const known = new Map<Kind, Unit[]>();
  let made = 0;
  // A few sites have a hundred units, most have ten.
  const places = Array.from({ length: sites }, (_, index) => ({
    name: `S${String(index + 1).padStart(4, '0')}`,
    weight: random.gamma(0.7),
  }));

  const visit = (kind: Kind, job: JobType, year: number): Unit => {
    const list = known.get(kind) ?? [];
    known.set(kind, list);
    if (job !== 'disposal' && list.length && random.chance(COMES_BACK)) return random.pick(list);
    const unit = {
      name: `A${String(++made).padStart(5, '0')}`,
      site: random.pick(places, ({ weight }) => weight).name,
      kind,
      refrigerant: drawRefrigerant(kind, year, random),
      nameplateLb: drawNameplateLb(kind, random),
    };
    if (job !== 'disposal') list.push(unit);
    return unit;
  };

  return { visit };
};
