import type { ApplianceCategory, FlagDecision, FlagRule, JobType, MassUnit, VacuumUnit } from '@/lib/vocabulary';

/**
 * A recovery as it is judged. Masses in kg, pressures in kPa absolute, as numbers: judging is statistics, converted once
 * from the exact stored value.
 */
export type JudgedRecord = {
  id: string;
  recordRef: string;
  /** Local date of the company, `YYYY-MM-DD`. */
  recoveredOn: string;
  /** ISO instant; null when the ticket gives no time of day. */
  recoveredAt: string | null;
  technicianId: string;
  siteId: string;
  applianceId: string;
  cylinderId: string | null;
  category: ApplianceCategory | null;
  jobType: JobType | null;
  refrigerant: string;
  nameplateChargeKg: number;
  /** Nameplate and added charge: what the yield is a share of. Above zero. */
  fullChargeKg: number;
  /** Cylinder on the scale before and after. */
  startWeightKg: number | null;
  endWeightKg: number | null;
  recoveredMassKg: number;
  /** The unit the ticket was written in; the steps of its scale are read off in it. */
  massUnit: MassUnit;
  finalVacuumKpaAbs: number | null;
  vacuumUnit: VacuumUnit | null;
  holdMinutes: number | null;
  holdRiseKpa: number | null;
  /** The level of 40 CFR 82.156 for this appliance; null where none is known. */
  requiredLevelKpaAbs: number | null;
  /** What was decided on flags of this record, the last decision of each rule. */
  decisions: readonly { rule: FlagRule; decision: FlagDecision }[];
  /** Left out of every average: decided to be an entry error. */
  isExcluded: boolean;
};

/** What is known of a cylinder besides the records; each part may be unknown. Masses in kg. */
export type JudgedCylinder = {
  id: string;
  refrigerant: string | null;
  tareWeightKg: number | null;
  /** The most it may hold, net. */
  fillLimitKg: number | null;
};
