/** A source of numbers from 0 to 1 that gives the same ones for the same seed (mulberry32, public domain). */
export const seeded = (seed: number) => {
  let state = seed >>> 0;
  return (): number => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state);
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed;
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4_294_967_296;
  };
};

const HEADER =
  'record_ref,recovered_at,technician,site,appliance,branch,appliance_category,refrigerant,nameplate_charge,' +
  'start_weight,end_weight,recovered_mass,mass_unit,final_vacuum,vacuum_unit,hold_minutes,job_type,cylinder';
const REFRIGERANTS = ['R-410A', 'R-22', 'R-134a', 'R-404A', 'R-407C', 'R-32', 'R-448A'];
const CATEGORIES = ['comfort_cooling', 'commercial_refrigeration', 'small_appliance', 'other'];
const JOBS = ['service', 'repair', 'conversion', 'disposal'];
const DAY_MS = 86_400_000;

/**
 * A recovery file of an invented contractor: `rows` rows over ten years, thirty technicians, four hundred sites with
 * three appliances each. The same seed gives the same bytes. Comes in pieces of about a thousand rows.
 */
export function* recoveryFile(rows: number, seed = 1, refPrefix = 'B'): Generator<string> {
  const random = seeded(seed);
  const upTo = (n: number) => Math.floor(random() * n);
  const pick = (list: readonly string[]) => list[upTo(list.length)] ?? '';
  const line = (nth: number) => {
    const day = new Date(Date.UTC(2014, 0, 1) + Math.floor((nth / rows) * 3652) * DAY_MS).toISOString().slice(0, 10);
    const time = `${String(7 + upTo(10)).padStart(2, '0')}:${String(upTo(60)).padStart(2, '0')}:00`;
    const site = upTo(400);
    // Tenths of a pound as whole numbers, so that the two weights and the mass agree exactly.
    const nameplate = 20 + upTo(200);
    const mass = Math.floor(nameplate * (0.6 + 0.4 * random()));
    const start = 170 + upTo(300);
    const lb = (tenths: number) => (tenths / 10).toFixed(1);
    return [
      ...[`${refPrefix}-${String(nth).padStart(7, '0')}`, `${day}T${time}`, `Technician ${upTo(30)}`, `Site ${site}`],
      ...[`RTU-${site}-${upTo(3)}`, `Branch ${site % 3}`, pick(CATEGORIES), pick(REFRIGERANTS), lb(nameplate)],
      ...[lb(start), lb(start + mass), lb(mass), 'lb', lb(50 + upTo(100)), 'inhg', String(5 + upTo(20))],
      ...[pick(JOBS), `CYL-${upTo(300)}`],
    ].join(',');
  };
  let piece = `${HEADER}\n`;
  for (let nth = 1; nth <= rows; nth += 1) {
    piece += `${line(nth)}\n`;
    if (nth % 1000 === 0) {
      yield piece;
      piece = '';
    }
  }
  if (piece) yield piece;
}
