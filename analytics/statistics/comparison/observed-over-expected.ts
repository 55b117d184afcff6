import { sum } from 'simple-statistics';
import { requireNotNegative, requirePositive } from '../checked';
import { type Estimate, enough, tooFew } from '../estimate';
import { PRIOR_JOBS } from './case-mix';
import { TalliesWithout } from './tallies';

/** A recovery by mass, in one unit of mass throughout. */
export type MassJob = { technician: string; cell: string; fullCharge: number; recovered: number };

export type ObservedOverExpected = {
  technician: string;
  observed: number;
  expected: number;
  ratio: number;
  standardError: number;
  /** Jobs of equal size that would tell as much: a handful of chillers may decide it all. */
  effectiveJobs: number;
};
export type MassComparison = {
  expectedPerJob: number[];
  /** Weighted standard deviation of recovered over expected, less 1. */
  relativeDeviation: number;
  technicians: ObservedOverExpected[];
};

const expectedMasses = (jobs: readonly MassJob[], priorJobs: number): number[] => {
  const recovered = new TalliesWithout();
  const charged = new TalliesWithout();
  for (const job of jobs) {
    requirePositive(job.fullCharge, 'A full charge');
    requireNotNegative(job.recovered, 'A recovered mass');
    for (const key of ['all', `cell ${job.cell}`]) {
      recovered.add(key, job.technician, job.recovered);
      charged.add(key, job.technician, job.fullCharge);
    }
  }
  return jobs.map(({ technician, cell, fullCharge }) => {
    const key = `cell ${cell}`;
    const base = recovered.without('all', technician).sum / charged.without('all', technician).sum;
    const charge = charged.without(key, technician);
    if (charge.count === 0) return fullCharge * base;
    const prior = (priorJobs * charge.sum) / charge.count;
    return (fullCharge * (recovered.without(key, technician).sum + prior * base)) / (charge.sum + prior);
  });
};

/**
 * Recovered mass over what colleagues' jobs of the same kind promise, by technician in the order of names. For money
 * only: a few large charges decide it, so it says little about skill. Needs two technicians. Effective number of jobs
 * (ΣE)²/ΣE² of Kish, Survey Sampling (1965), 11.7.
 */
export const observedOverExpected = (jobs: readonly MassJob[], priorJobs = PRIOR_JOBS): Estimate<MassComparison> => {
  const names = [...new Set(jobs.map((job) => job.technician))].sort();
  if (names.length < 2) return tooFew(2, names.length, 'technicians');
  const expectedPerJob = expectedMasses(jobs, priorJobs);
  if (expectedPerJob.some((mass) => mass === 0)) return tooFew(1, 0, 'recovered masses of colleagues');
  const pairs = jobs.map((job, index) => ({ ...job, expected: expectedPerJob[index] ?? 0 }));
  const squares = sum(pairs.map(({ expected, recovered }) => expected * (recovered / expected - 1) ** 2));
  const relativeDeviation = Math.sqrt(squares / sum(expectedPerJob));
  const technicians = names.map((technician) => {
    const own = pairs.filter((pair) => pair.technician === technician);
    const observed = sum(own.map((pair) => pair.recovered));
    const expected = sum(own.map((pair) => pair.expected));
    const effectiveJobs = expected ** 2 / sum(own.map((pair) => pair.expected ** 2));
    const standardError = relativeDeviation / Math.sqrt(effectiveJobs);
    return { technician, observed, expected, ratio: observed / expected, standardError, effectiveJobs };
  });
  return enough({ expectedPerJob, relativeDeviation, technicians });
};
