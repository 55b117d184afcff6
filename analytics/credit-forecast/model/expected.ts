import { type MassHistory, monthOfYear, refrigerantsOf } from './history';
import { jobsAhead, kgPerJob, type LargePlant, largePlant } from './large-plant';
import type { ChosenMethod } from './level-methods';
import { type ShareTrend, sharesAhead, shareTrends } from './mix';
import { type Deseasonalised, deseasonalise, routineForecasts } from './routine';

/** What the months ahead are expected to bring, and all that their spread is drawn from. */
export type Expected = {
  refrigerants: readonly string[];
  horizon: number;
  routine: Deseasonalised;
  /** Kg of routine jobs still to come, a figure a month. */
  routineKg: number[];
  trends: readonly ShareTrend[];
  plant: LargePlant;
  /** Large jobs still to come, a figure a month. */
  jobs: number[];
  /** Kg that the first month has brought already. */
  soFarKg: ReadonlyMap<string, number>;
};

/** The months ahead after the last whole one: the routine mass by its shares, and large jobs apart. */
export const expectedMass = (history: MassHistory, method: ChosenMethod, horizon: number): Expected => {
  const routine = deseasonalise(history);
  const forecasts = routineForecasts(history, routine, horizon);
  const routineKg = forecasts.get(method) ?? forecasts.get('combination') ?? [];
  const plant = largePlant(history, routine.season);
  const levels = routineKg.map(
    (mass, step) => mass / (routine.season[monthOfYear(history, history.months + step)] ?? 1),
  );
  return {
    refrigerants: refrigerantsOf(history),
    horizon,
    routine,
    routineKg,
    trends: shareTrends(history),
    plant,
    jobs: jobsAhead(history, plant, routine.masses, levels),
    soFarKg: new Map(),
  };
};

/** Mean kg by refrigerant (in their order) and month. */
export const meansOf = ({ refrigerants, horizon, routineKg, trends, plant, jobs, soFarKg }: Expected): number[][] => {
  const perJob = kgPerJob(plant);
  const place = new Map(trends.map(({ refrigerant }, at) => [refrigerant, at]));
  const shares = Array.from({ length: horizon }, (_, step) => sharesAhead(trends, step + 1));
  return refrigerants.map((refrigerant) =>
    shares.map((own, step) => {
      const share = own[place.get(refrigerant) ?? -1] ?? 0;
      const toCome = (routineKg[step] ?? 0) * share + (jobs[step] ?? 0) * (perJob.get(refrigerant) ?? 0);
      return step === 0 ? toCome + (soFarKg.get(refrigerant) ?? 0) : toCome;
    }),
  );
};
