import type { CrewClass, SimulatedFault } from './options';

/** What was planted in a simulated company. Rows are counted from 1 below the header. */
export type SimulatedTruth = {
  seed: string;
  technicians: {
    name: string;
    class: CrewClass;
    skill_logit: number;
    learning: { start_drop_logit: number; jobs_scale: number } | null;
    stops_early_rate: number;
    first_month: string;
    last_month: string;
    records: number;
    /** Points of nameplate that an average job of his gives more than one of a middling colleague. */
    true_yield_points: number;
  }[];
  planted_bad_technicians: string[];
  planted_drifting_scale: { technician: string; from_month: string; factor: number }[];
  bad_records: { row: number; kinds: SimulatedFault[] }[];
  /** Rows of systems that were short on arrival, as far as they are right otherwise. */
  naturally_low_rows: number[];
};
