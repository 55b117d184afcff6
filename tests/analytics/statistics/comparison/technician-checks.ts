import { z } from 'zod';
import { cellOf } from '@/analytics/statistics/comparison/case-mix';
import { derSimonianLaird } from '@/analytics/statistics/comparison/dersimonian-laird';
import { observedOverExpected } from '@/analytics/statistics/comparison/observed-over-expected';
import { compareTechnicians } from '@/analytics/statistics/comparison/technician-comparison';
import { technicianEffects } from '@/analytics/statistics/comparison/technician-effects';
import { deviations, MAD_TO_SIGMA } from '@/analytics/statistics/robust/deviations';
import { given } from '../given';
import type { Checks } from '../reference';

const numbers = z.array(z.number());
const texts = z.array(z.string());
const FEWEST = 2;

const effects: Checks[string] = (entry, compare) => {
  const schema = z.object({
    tech: texts,
    category: texts,
    job: texts,
    nameplate: numbers,
    recovered: numbers,
    K: z.number(),
  });
  const { tech, category, job, nameplate, recovered, K } = schema.parse(entry.input);
  const jobs = tech.map((technician, row) => ({
    technician,
    category: category[row] ?? '',
    jobType: job[row] ?? '',
    recoveryYield: (recovered[row] ?? Number.NaN) / (nameplate[row] ?? Number.NaN),
  }));
  const { perJob, variances, technicians } = given(technicianEffects(jobs, K));
  const compared = given(compareTechnicians(technicians, FEWEST));
  const spread = given(compared.spread);
  const cells = [...new Set(jobs.map(cellOf))].sort();
  const moments = derSimonianLaird(
    technicians.map(({ effect, standardError }) => ({ estimate: effect, variance: standardError ** 2 })),
  );
  const judged = compared.technicians;
  const { tau2_paule_mandel, tau2_dl, ...expected } = z
    .looseObject({ tau2_paule_mandel: z.number(), tau2_dl: z.number() })
    .parse(entry.expected);
  compare(
    {
      expected_yield: perJob.map((own) => own.expected),
      residual: perJob.map((own) => own.difference),
      pooled_variance: variances.pooled,
      cells,
      cell_variance: cells.map((cell) => variances.byCell.get(cell)),
      tech: judged.map((own) => own.technician),
      n: judged.map((own) => own.jobs),
      effect: judged.map((own) => own.effect),
      unweighted_effect: judged.map((own) => own.plainMean),
      se: judged.map((own) => own.standardError),
      z: judged.map((own) => own.score),
      winsor_bounds: [spread.bounds.lower, spread.bounds.upper],
      phi_winsorised: spread.factorWinsorised,
      tau2_winsorised: spread.betweenVarianceWinsorised,
      z_adjusted: judged.map((own) => own.allowingScore),
      bh_p: judged.map((own) => own.p),
      bh_p_adjusted: judged.map((own) => own.allowingP),
      mu: compared.mean,
      shrink_weight_B: judged.map((own) => own.shrunk.weight),
      shrunk: judged.map((own) => own.shrunk.estimate),
      shrunk_se: judged.map((own) => own.shrunk.standardError),
      shrunk_lower95: judged.map((own) => own.shrunk.lower),
      shrunk_upper95: judged.map((own) => own.shrunk.upper),
    },
    expected,
  );
  compare(
    { tau2_paule_mandel: compared.betweenVariance, tau2_dl: given(moments) },
    { tau2_paule_mandel, tau2_dl },
    { relative: 1e-6 },
  );
};

const masses: Checks[string] = (entry, compare) => {
  const schema = z.object({
    tech: texts,
    cell: texts,
    nameplate: numbers,
    recovered: numbers,
    prior_records_K: z.number(),
  });
  const { tech, cell, nameplate, recovered, prior_records_K } = schema.parse(entry.input);
  const jobs = tech.map((technician, row) => ({
    technician,
    cell: cell[row] ?? '',
    fullCharge: nameplate[row] ?? Number.NaN,
    recovered: recovered[row] ?? Number.NaN,
  }));
  const { expectedPerJob, relativeDeviation, technicians } = given(observedOverExpected(jobs, prior_records_K));
  const residuals = jobs.map((job, row) => job.recovered / (expectedPerJob[row] ?? Number.NaN) - 1);
  const ratios = technicians.map(({ ratio, standardError }) => ({ estimate: ratio, variance: standardError ** 2 }));
  compare(
    {
      expected_per_record: expectedPerJob,
      residual: residuals,
      residual_sd_weighted: relativeDeviation,
      residual_mad_normal: MAD_TO_SIGMA * given(deviations(residuals)).mad,
      tech: technicians.map((own) => own.technician),
      observed: technicians.map((own) => own.observed),
      expected_sum: technicians.map((own) => own.expected),
      oe: technicians.map((own) => own.ratio),
      n_effective: technicians.map((own) => own.effectiveJobs),
      se: technicians.map((own) => own.standardError),
      z: technicians.map((own) => (own.ratio - 1) / own.standardError),
      tau2_dl_about_pooled_mean: given(derSimonianLaird(ratios)),
    },
    entry.expected,
  );
};

export const technicianChecks: Checks = { technician_effect: effects, casemix_oe: masses };
