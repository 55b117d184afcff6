/** A recovery as people are compared by it. Entry errors are left out before. */
export type ComparedRecovery = {
  technicianId: string;
  category: string | null;
  jobType: string | null;
  /** Above zero. */
  fullChargeKg: number;
  recoveredMassKg: number;
  /** Local day of the company, YYYY-MM-DD. */
  recoveredOn: string;
  /** Absolute pressure at the end of the pull; null where the ticket has none. */
  finalVacuumKpaAbs: number | null;
  /** The level of 40 CFR 82.156 for the appliance; null where none is known. */
  requiredLevelKpaAbs: number | null;
  /** Whether a hold was made; null where the ticket says nothing of one. */
  held: boolean | null;
  /** Whether the cylinder was weighed before and after. */
  weighedTwice: boolean;
  /** Whether the ticket was written on the day of the job; null where that is not known, as of imported ones. */
  writtenSameDay: boolean | null;
  /** What somebody has decided about the job: the unit had come short, or the pull was stopped early. */
  decided: 'short on arrival' | 'stopped early' | null;
};

/** Full charge from which a system is large plant: 100 lb. Its pulls and vacuums are of another kind. */
export const LARGE_PLANT_KG = 45.359237;
