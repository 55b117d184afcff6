import type { Random } from '../random';

/** A cylinder while it is filled; pounds. */
export type SimulatedCylinder = { serial: string; tareLb: number; roomLb: number; grossLb: number };

const SIZES = [
  { tareLb: 17.5, roomLb: 24, spreadLb: 0.25 },
  { tareLb: 27, roomLb: 40, spreadLb: 0.25 },
  { tareLb: 60, roomLb: 100, spreadLb: 0.5 },
  { tareLb: 310, roomLb: 800, spreadLb: 4 },
] as const;
/** A cylinder is begun for a pull that fills it to this share at most; the next larger one otherwise. */
const BEGUN_UP_TO = 0.6;

/** Each technician's open cylinder of each refrigerant and size; a full one is never seen again. */
export const openCylinders = (random: Random) => {
  const open = new Map<string, SimulatedCylinder>();
  let made = 0;

  const take = (technician: string, refrigerant: string, pulledLb: number): SimulatedCylinder => {
    const size = SIZES.find(({ roomLb }) => pulledLb <= BEGUN_UP_TO * roomLb) ?? SIZES[3];
    const key = `${technician}/${refrigerant}/${size.tareLb}`;
    const mine = open.get(key);
    if (mine && mine.grossLb - mine.tareLb + pulledLb <= mine.roomLb) return mine;
    const tareLb = size.tareLb + random.normal(0, size.spreadLb);
    const serial = `C${String(++made).padStart(5, '0')}`;
    const cylinder = { serial, tareLb, roomLb: Math.max(size.roomLb, pulledLb), grossLb: tareLb };
    open.set(key, cylinder);
    return cylinder;
  };

  return { take };
};
export type OpenCylinders = ReturnType<typeof openCylinders>;
