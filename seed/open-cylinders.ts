import { Temporal } from 'temporal-polyfill';
import type { Disposition } from '@/lib/vocabulary';
import { type Cylinder, type CylinderPool, fillLimitLb } from './cylinders';
import type { Random } from './random';
import type { Technician } from './technicians';

const LARGE_LB = 32;
/** Somebody out of reach of the shop fills on past the limit. */
const OVERFILLS = 0.012;
/** Somebody takes the wrong cylinder from the van. */
const MIXES = 0.0018;

export type Filling = { cylinder: Cylinder; fault: 'mixed_cylinder' | 'overfilled' | null };

/** Which cylinder each technician has open for what, and when he takes another. */
export const openCylinders = (pool: CylinderPool, random: Random) => {
  const open = new Map<string, Cylinder>();
  const sizeOf = (lb: number) => (lb > LARGE_LB ? 'large' : 'field');
  const hasRoom = (cylinder: Cylinder, lb: number) =>
    !cylinder.mixed && cylinder.contentLb + lb <= fillLimitLb(cylinder);
  const keyOf = ({ name }: Technician, refrigerant: string, lb: number) => `${name}/${sizeOf(lb)}/${refrigerant}`;

  /** The cylinder this charge goes into. */
  const choose = (technician: Technician, refrigerant: string, chargeLb: number, day: string): Filling => {
    const key = keyOf(technician, refrigerant, chargeLb);
    const mine = open.get(key);
    if (random.chance(MIXES)) {
      const family = `${technician.name}/${sizeOf(chargeLb)}/`;
      const other = [...open].find(
        ([k, c]) => k.startsWith(family) && k !== key && c.contentLb > 2 && hasRoom(c, chargeLb),
      );
      if (other) return { cylinder: other[1], fault: 'mixed_cylinder' };
    }
    if (mine && hasRoom(mine, chargeLb)) return { cylinder: mine, fault: null };
    if (mine && !mine.mixed && chargeLb > 4 && random.chance(OVERFILLS)) return { cylinder: mine, fault: 'overfilled' };
    if (mine)
      pool.send(
        mine,
        Temporal.PlainDate.from(day)
          .add({ days: random.integer(7, 21) })
          .toString(),
      );
    const next = pool.take(technician.branch, refrigerant, chargeLb, day);
    open.set(key, next);
    return { cylinder: next, fault: null };
  };

  /** Keeps what went in, unless it went back into the system. True when the cylinder is now past its limit. */
  const fill = ({ cylinder, fault }: Filling, recoveredLb: number, disposition: Disposition): boolean => {
    const past = cylinder.contentLb + recoveredLb > fillLimitLb(cylinder) * 1.01;
    if (disposition !== 'returned_to_system') cylinder.contentLb += recoveredLb;
    if (fault === 'mixed_cylinder') cylinder.mixed = true;
    return past;
  };

  return { choose, fill };
};
