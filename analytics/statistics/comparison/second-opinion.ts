import { mean } from 'simple-statistics';
import { type Estimate, enough, tooFew } from '../estimate';
import { groupBy } from '../group-by';
import { deviations, MAD_TO_SIGMA } from '../robust/deviations';
import { cellOf, type Job } from './case-mix';

/** Jobs a person under which a second opinion is worth having; above, it would point at people without cause. */
export const SECOND_OPINION_BELOW = 100;

const BOUND = 3;

/**
 * Mean robust score by technician, less the mean of all: (yield − median of the cell)/(1.4826 × upper MAD) held within
 * ± 3, so that an empty appliance counts no more than a poor one. Jobs in cells without spread are left out. Needs two
 * technicians. Rousseeuw & Croux (1993), JASA 88, 1273-1283.
 */
export const secondOpinion = (jobs: readonly Job[]): Estimate<Map<string, number>> => {
  const cells = groupBy(jobs, cellOf);
  const scored = [...cells.values()].flatMap((cell) => {
    const spread = deviations(cell.map((job) => job.recoveryYield));
    if (!spread.enough || spread.value.upperMad === 0) return [];
    const { median, upperMad } = spread.value;
    return cell.map(({ technician, recoveryYield }) => {
      const score = (recoveryYield - median) / (MAD_TO_SIGMA * upperMad);
      return { technician, score: Math.min(BOUND, Math.max(-BOUND, score)) };
    });
  });
  const byTechnician = groupBy(scored, (own) => own.technician);
  if (byTechnician.size < 2) return tooFew(2, byTechnician.size, 'technicians');
  const overall = mean(scored.map((own) => own.score));
  return enough(
    new Map([...byTechnician].map(([technician, own]) => [technician, mean(own.map(({ score }) => score)) - overall])),
  );
};
