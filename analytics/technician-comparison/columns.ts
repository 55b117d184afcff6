import { type ComparedRecovery, LARGE_PLANT_KG } from './recovery';

/** Recoveries as columns: figures of a hundred thousand of them are gone over many times. */
export type Columns = {
  count: number;
  /** Ids in their order; `technician` holds positions in it. */
  technicians: readonly string[];
  technician: Int32Array;
  /** Category and size: what a full pull gives depends on it. */
  kind: Int32Array;
  kinds: number;
  /** Kind and required level: how deep a pull goes depends on it. */
  vacuumKind: Int32Array;
  vacuumKinds: number;
  /** Kind and job type: how often a unit comes short depends on both. */
  cell: Int32Array;
  cells: number;
  jobType: Int32Array;
  jobTypes: number;
  /** Recovered mass over full charge. */
  yields: Float64Array;
  /** Final vacuum, kPa absolute; NaN where none is told. */
  vacuums: Float64Array;
  /** Days since 1970. */
  days: Int32Array;
  /** KNOWN_* or 0. */
  decided: Uint8Array;
};

export const KNOWN_SHORT = 1;
export const KNOWN_EARLY = 2;

const DAY_MS = 86_400_000;

/** Days since 1970 of a day written YYYY-MM-DD, and back. */
export const dayNumber = (date: string): number => Math.round(Date.parse(`${date}T00:00:00Z`) / DAY_MS);
export const dayWritten = (day: number): string => new Date(day * DAY_MS).toISOString().slice(0, 10);

/** Keys numbered in the order in which they first come. */
class Numbers {
  readonly #numbers = new Map<string, number>();

  of(key: string): number {
    const known = this.#numbers.get(key);
    if (known !== undefined) return known;
    const next = this.#numbers.size;
    this.#numbers.set(key, next);
    return next;
  }

  get size(): number {
    return this.#numbers.size;
  }
}

/** Full charges at which one size of appliance ends and the next begins, in lb: 10, 25 and large plant from 100. */
const SIZES_KG = [4.5359237, 11.33980925, LARGE_PLANT_KG];
/** Recoveries of a size below which it is not told from the other sizes of its category. */
const LEAST_OF_SIZE = 80;

const sizeOf = (fullChargeKg: number): number => {
  let size = 0;
  while (size < SIZES_KG.length && fullChargeKg >= (SIZES_KG[size] ?? 0)) size += 1;
  return size;
};

/** Kinds by name: size by size where there are enough, else by category and whether large plant. */
const kindNames = (recoveries: readonly ComparedRecovery[]): string[] => {
  const sizes = new Map<string | null, string[]>();
  const fine = recoveries.map(({ category, fullChargeKg }) => {
    let names = sizes.get(category);
    if (!names) {
      names = [0, 1, 2, 3].map((size) => `${category}|${size}`);
      sizes.set(category, names);
    }
    return names[sizeOf(fullChargeKg)] ?? '';
  });
  const counts = new Map<string, number>();
  for (const name of fine) counts.set(name, (counts.get(name) ?? 0) + 1);
  return fine.map((name, at) => {
    if ((counts.get(name) ?? 0) >= LEAST_OF_SIZE) return name;
    const large = (recoveries[at]?.fullChargeKg ?? 0) >= LARGE_PLANT_KG;
    return `${recoveries[at]?.category}|${large ? 'large' : 'any'}`;
  });
};

const decidedCode = ({ decided }: ComparedRecovery): number => {
  if (decided === null) return 0;
  return decided === 'short on arrival' ? KNOWN_SHORT : KNOWN_EARLY;
};

/** Recoveries in the order in which they are given, which is that of time. */
export const toColumns = (recoveries: readonly ComparedRecovery[]): Columns => {
  const count = recoveries.length;
  const technicians = [...new Set(recoveries.map((own) => own.technicianId))].sort();
  const places = new Map(technicians.map((id, place) => [id, place]));
  const [kinds, vacuumKinds, cells, jobTypes] = [new Numbers(), new Numbers(), new Numbers(), new Numbers()];
  const names = kindNames(recoveries);
  const dayNumbers = new Map<string, number>();
  const columns = {
    technician: new Int32Array(count),
    kind: new Int32Array(count),
    vacuumKind: new Int32Array(count),
    cell: new Int32Array(count),
    jobType: new Int32Array(count),
    yields: new Float64Array(count),
    vacuums: new Float64Array(count),
    days: new Int32Array(count),
    decided: new Uint8Array(count),
  };
  recoveries.forEach((own, at) => {
    const kind = names[at] ?? '';
    let day = dayNumbers.get(own.recoveredOn);
    if (day === undefined) {
      day = dayNumber(own.recoveredOn);
      dayNumbers.set(own.recoveredOn, day);
    }
    columns.technician[at] = places.get(own.technicianId) ?? 0;
    columns.kind[at] = kinds.of(kind);
    columns.vacuumKind[at] = vacuumKinds.of(`${kind}|${own.requiredLevelKpaAbs}`);
    columns.cell[at] = cells.of(`${kind}|${own.jobType}`);
    columns.jobType[at] = jobTypes.of(`${own.jobType}`);
    columns.yields[at] = own.recoveredMassKg / own.fullChargeKg;
    columns.vacuums[at] = own.finalVacuumKpaAbs ?? Number.NaN;
    columns.days[at] = day;
    columns.decided[at] = decidedCode(own);
  });
  return {
    ...columns,
    count,
    technicians,
    kinds: kinds.size,
    vacuumKinds: vacuumKinds.size,
    cells: cells.size,
    jobTypes: jobTypes.size,
  };
};
