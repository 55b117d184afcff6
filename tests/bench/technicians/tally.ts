import type { TechnicianResult } from '@/analytics/technician-comparison/technician-result';
import type { SimulatedTruth } from '@/seed/simulation/truth';

export type Planted = SimulatedTruth['technicians'][number];

/** What is said of a technician, whichever way it was come by. The range is that of the effect, in points of nameplate. */
export type Called = {
  name: string;
  verdict: TechnicianResult['verdict'];
  look: boolean;
  hasScale: boolean;
  range: { low: number; high: number } | null;
};

/** How technicians of one class were judged, and how often their range held the truth. */
export class Tally {
  technicians = 0;
  tooFew = 0;
  below = 0;
  above = 0;
  look = 0;
  scale = 0;
  judged = 0;
  covered = 0;

  add({ verdict, look, hasScale, range }: Called, truth: number): void {
    this.technicians += 1;
    this.tooFew += Number(verdict === 'too few');
    this.below += Number(verdict === 'below');
    this.above += Number(verdict === 'above');
    this.look += Number(look);
    this.scale += Number(hasScale);
    if (!range) return;
    this.judged += 1;
    this.covered += Number(range.low <= truth && truth <= range.high);
  }
}

/** Learners are ordinary people who were hired and learned. */
export const classOf = ({ class: of, learning, records }: Planted): string => {
  if (of.startsWith('bad_')) return records >= 60 ? of : `${of}, under 60 jobs`;
  return learning ? 'learner' : of;
};

/** Points of nameplate that a technician's average job gives more than his colleagues' average job. */
export const trueEffect = (own: Planted, crew: readonly Planted[]): number => {
  const others = crew.filter((other) => other !== own);
  const jobs = others.reduce((sum, other) => sum + other.records, 0);
  const mean = others.reduce((sum, other) => sum + other.records * other.true_yield_points, 0) / Math.max(1, jobs);
  return own.true_yield_points - mean;
};
