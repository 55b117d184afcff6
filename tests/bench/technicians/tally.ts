import type { TechnicianResult } from '@/analytics/technician-comparison/technician-result';
import type { SimulatedTruth } from '@/seed/simulation/truth';

export type Planted = SimulatedTruth['technicians'][number];

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

  add(result: TechnicianResult, truth: number): void {
    this.technicians += 1;
    this.tooFew += Number(result.verdict === 'too few');
    this.below += Number(result.verdict === 'below');
    this.above += Number(result.verdict === 'above');
    this.look += Number(result.look);
    this.scale += Number(result.scale !== null);
    if (!result.effect) return;
    this.judged += 1;
    this.covered += Number(result.effect.low <= truth && truth <= result.effect.high);
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

const percent = (part: number, of: number): string => (of > 0 ? `${((100 * part) / of).toFixed(1)} %` : '');

/** One line a class. */
export const report = (tallies: ReadonlyMap<string, Tally>): void =>
  console.table(
    Object.fromEntries(
      [...tallies].map(([name, own]) => [
        name,
        {
          technicians: own.technicians,
          'too few': own.tooFew,
          below: own.below,
          'below, share': percent(own.below, own.technicians),
          above: own.above,
          look: own.look,
          'called a scale': own.scale,
          'range holds': percent(own.covered, own.judged),
        },
      ]),
    ),
  );
