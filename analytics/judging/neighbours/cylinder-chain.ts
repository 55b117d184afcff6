import type { JudgedRecord } from '../record';
import { byTime, isSameMoment, type Neighbours } from './neighbours';

/** The weighing of the same cylinder that came next: what stood on the scale then, and whose ticket says so. */
export type NextWeighing = { startWeightKg: number; record: JudgedRecord };

/** Tickets of one month are often written in another order than the work was done. */
const SHUFFLED_DAYS = 31;
/** Two readings of one weight lie nearer than this. */
const SAME_KG = 0.07;

const dayNumber = (date: string): number => Date.parse(`${date}T00:00:00Z`) / 86_400_000;

/**
 * The next weighing of the cylinder this record filled: the lightest start that is not below its own. A cylinder only
 * grows heavier until it is emptied, so weights tell the order better than dates within a month; a much later start
 * below this one's says that it was emptied in between. Null where there is none.
 */
export const nextWeighing = (neighbours: Neighbours, record: JudgedRecord): NextWeighing | null => {
  const { cylinderId, startWeightKg: start } = record;
  if (cylinderId === null || start === null) return null;
  const day = dayNumber(record.recoveredOn);
  let next: NextWeighing | null = null;
  for (const other of neighbours.ofCylinder.get(cylinderId) ?? []) {
    // A doubled ticket starts where this one does and says nothing about its end.
    if (other.id === record.id || other.startWeightKg === null || isSameMoment(other, record)) continue;
    const later = dayNumber(other.recoveredOn) - day;
    if (later < -SHUFFLED_DAYS) continue;
    const above = other.startWeightKg - start;
    if (above < -SAME_KG && later > SHUFFLED_DAYS) break;
    // Who pulled nothing leaves the weight as it was, so that a start like his own may well be the next.
    if (above < -SAME_KG || (above < SAME_KG && record.recoveredMassKg > SAME_KG && byTime(other, record) < 0))
      continue;
    if (next === null || other.startWeightKg < next.startWeightKg)
      next = { startWeightKg: other.startWeightKg, record: other };
  }
  return next;
};
