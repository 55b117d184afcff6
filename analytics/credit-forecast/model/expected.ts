import { type MassHistory, monthOfYear, refrigerantsOf } from './history';
import { jobsAhead, kgPerJob, type LargePlant, largePlant } from './large-plant';
import type { ChosenMethod } from './level-methods';
import { type ShareTrend, sharesAhead, shareTrends } from './mix';
import { type Deseasonalised, deseasonalise, routineForecasts } from './routine';

/** What the months ahead are expected to bring, and all that their spread is drawn from. */
export type Expected = {
  refrigerants: string[];
  horizon: number;
  routine: Deseasonalised;
  /** Kg of routine jobs, a figure a month. */
  routineKg: number[];
  trends: ShareTrend[];
  plant: LargePlant;
  jobs: number[];
  /** Mean kg by refrigerant (in the order above) and month. */
  meanKg: number[][];
};

/** Means of the coming months by refrigerant: the routine mass by its shares, and large jobs apart. */
export const expectedMass = (history: MassHistory, method: ChosenMethod, horizon: number): Expected => {
  const refrigerants = refrigerantsOf(history);
  const routine = deseasonalise(history);
  const forecasts = routineForecasts(history, routine, horizon);
  const routineKg = forecasts.get(method) ?? forecasts.get('combination') ?? [];
  const trends = shareTrends(history);
  const plant = largePlant(history, routine.season);
  const steps = Array.from({ length: horizon }, (_, step) => step + 1);
  const levels = routineKg.map(
    (mass, step) => mass / (routine.season[monthOfYear(history, history.months + step)] ?? 1),
  );
  const jobs = jobsAhead(history, plant, routine.masses, levels);
  const perJob = kgPerJob(plant);
  const place = new Map(trends.map(({ refrigerant }, at) => [refrigerant, at]));
  const shares = steps.map((step) => sharesAhead(trends, step));
  const meanKg = refrigerants.map((refrigerant) =>
    steps.map((_, step) => {
      const share = shares[step]?.[place.get(refrigerant) ?? -1] ?? 0;
      return (routineKg[step] ?? 0) * share + (jobs[step] ?? 0) * (perJob.get(refrigerant) ?? 0);
    }),
  );
  return { refrigerants, horizon, routine, routineKg, trends, plant, jobs, meanKg };
};
