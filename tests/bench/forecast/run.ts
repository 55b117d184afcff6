import { writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { forecastMass } from '@/analytics/credit-forecast/model/forecast';
import { trackRecord } from '@/analytics/credit-forecast/model/track-record';
import { madeUpCompany } from '@/tests/analytics/credit-forecast/made-up-company';
import { simulatedHistory } from './company-history';
import { type CompanyResult, HELD_BACK, measureCompany, PATHS, type SeriesResult, timed } from './measure';

/** Nothing was tuned on these: tuning had seeds of its own, named `tune`. */
const SEEDS = 'proof';
const COMPANIES = 40;
const SIZES = [1500, 2500, 4000, 6000];
const SPAN = { from: '2015-01', to: '2027-11' };

const mean = (values: readonly number[]): number => values.reduce((sum, value) => sum + value, 0) / values.length;
const rounded = (value: number): number => Number(value.toFixed(3));

const coverageOf = (results: readonly SeriesResult[], level: number) => {
  const own = results.filter((result) => result.level === level);
  const share = (some: readonly SeriesResult[]) => rounded(mean(some.map(({ inside }) => (inside ? 1 : 0))));
  return {
    all: share(own),
    byHorizon: Array.from({ length: HELD_BACK }, (_, step) => share(own.filter((result) => result.step === step))),
  };
};

const summaryOf = (results: readonly CompanyResult[]) => {
  const of = (pick: (result: CompanyResult) => number) => rounded(mean(results.map(pick)));
  const mase = {
    own: of(({ mase }) => mase.own),
    naive: of(({ mase }) => mase.naive),
    ets: of(({ mase }) => mase.ets),
    theta: of(({ mase }) => mase.theta),
  };
  const [total, byRefrigerant] = [
    results.flatMap((result) => result.total),
    results.flatMap((result) => result.byRefrigerant),
  ];
  return {
    companies: results.length,
    horizons1To6: {
      mase,
      overNaive: rounded(mase.own / mase.naive),
      overBetterOfEtsAndTheta: rounded(mase.own / Math.min(mase.ets, mase.theta)),
    },
    score80: { own: of(({ score80 }) => score80.own), naive: of(({ score80 }) => score80.naive) },
    year: {
      meanRatio: of(({ yearRatio }) => yearRatio),
      pooledRatio: rounded(mean(results.map(({ kg }) => kg.forecast)) / mean(results.map(({ kg }) => kg.actual))),
    },
    coverage: {
      total80: coverageOf(total, 0.8),
      total95: coverageOf(total, 0.95),
      refrigerant80: coverageOf(byRefrigerant, 0.8),
      refrigerant95: coverageOf(byRefrigerant, 0.95),
    },
    addsUp: results.every(({ addsUp }) => addsUp),
    cpuMs: { record: of(({ cpuMs }) => cpuMs.record), forecast: of(({ cpuMs }) => cpuMs.forecast) },
    slowestForecastCpuMs: rounded(Math.max(...results.map(({ cpuMs }) => cpuMs.forecast))),
  };
};

/** CPU time of one forecast of a company with twenty refrigerants once its track record is kept. */
const twentyRefrigerants = (): number => {
  const history = madeUpCompany('twenty', {
    months: 143,
    routineKg: 500,
    noise: 0.2,
    largeJobsPerMonth: 1.5,
    refrigerants: 20,
  });
  const record = trackRecord(history, 'twenty');
  return timed(() => forecastMass(history, record, { horizon: HELD_BACK, paths: PATHS, seed: 'twenty' })).cpuMs;
};

/**
 * `npx tsx tests/bench/forecast/run.ts`: forecasts twelve months that were held back, for simulated companies, and writes
 * what came of it to `tests/bench/forecast.json`. Another name of seeds and number of companies may follow.
 */
const main = (): void => {
  const [seeds = SEEDS, companies = String(COMPANIES)] = process.argv.slice(2);
  const results = Array.from({ length: Number(companies) }, (_, at) => {
    const size = SIZES[at % SIZES.length] ?? 4000;
    const result = measureCompany(simulatedHistory(`${seeds}-${at}`, size, SPAN), `${seeds}-${at}`);
    const { own, naive, ets, theta } = result.mase;
    console.log(
      at,
      size,
      [own, naive, ets, theta].map((error) => error.toFixed(2)).join(' '),
      result.yearRatio.toFixed(2),
    );
    return result;
  });
  const summary = { seeds, ...summaryOf(results), twentyRefrigerantsCpuMs: rounded(twentyRefrigerants()) };
  console.log(JSON.stringify(summary, null, 2));
  writeFileSync(join(import.meta.dirname, '../forecast.json'), `${JSON.stringify(summary, null, 2)}\n`);
};

main();
