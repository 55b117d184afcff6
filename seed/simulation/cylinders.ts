import type { Random } from '../random';

/** A cylinder while it is filled; pounds. */
export type SimulatedCylinder = { serial: string; tareLb: number; roomLb: number; grossLb: number };

const SIZES = [
  { upToLb: 14, tareLb: 17.5, roomLb: 24, stepOf: 0.25 },
  { upToLb: 30, tareLb: 27, roomLb: 40, stepOf: 0.25 },
  { upToLb: 80, tareLb: 60, roomLb: 100, stepOf: 0.5 },
  { upToLb: Number.POSITIVE_INFINITY, tareLb: 310, roomLb: 800, stepOf: 4 },
] as const;

/** Each technician's open cylinder of each refrigerant and size; a full one is never seen again. */
export const openCylinders = (random: Random) => {
  const open = new Map<string, SimulatedCylinder>();
  let made = 0;

  const take = (technician: string, refrigerant: string, chargeLb: number): SimulatedCylinder => {
    const size = SIZES.find(({ upToLb }) => chargeLb <= upToLb) ?? SIZES[3];
    const key = `${technician}/${refrigerant}/${size.tareLb}`;
    const mine = open.get(key);
    if (mine && mine.grossLb - mine.tareLb + chargeLb <= mine.roomLb) return mine;
    const tareLb = size.tareLb + random.normal(0, size.stepOf);
    const serial = `C${String(++made).padStart(5, '0')}`;
    const cylinder = { serial, tareLb, roomLb: Math.max(size.roomLb, chargeLb), grossLb: tareLb };
    open.set(key, cylinder);
    return cylinder;
  };

  return { take };
};
export type OpenCylinders = ReturnType<typeof openCylinders>;
