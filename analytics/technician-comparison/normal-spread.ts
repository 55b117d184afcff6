import { median } from 'simple-statistics';
import { MAD_TO_SIGMA } from '../statistics/robust/deviations';

export type NormalSpread = {
  /** The technician in the middle. */
  centre: number;
  /** How much sound technicians normally differ beyond the luck of their jobs, as a standard deviation. */
  spread: number;
  /** Degrees of freedom that the spread is known by. */
  freedom: number;
};

/** Technicians' worth of what is known beforehand about the spread. */
const PRIOR_TECHNICIANS = 4;

/**
 * The spread between technicians from the median distance to the one in the middle, so that those who truly differ do
 * not hide behind a spread that they made themselves; the luck of the jobs is taken off. Drawn towards `usual`, since a
 * crew of a dozen tells little about it. The median distance takes the place of the winsorised one of Spiegelhalter
 * (2005), Quality and Safety in Health Care 14, 347-351: in a small crew two who are far off move that.
 */
export const normalSpread = (
  estimates: readonly number[],
  standardErrors: readonly number[],
  usual: number,
): NormalSpread => {
  const members = estimates.length;
  if (members === 0) return { centre: 0, spread: usual, freedom: PRIOR_TECHNICIANS };
  const centre = median([...estimates]);
  const distance = MAD_TO_SIGMA * median(estimates.map((own) => Math.abs(own - centre)));
  const luck = median(standardErrors.map((error) => error * error));
  const beyond = Math.max(0, distance * distance - luck);
  const variance = (members * beyond + PRIOR_TECHNICIANS * usual * usual) / (members + PRIOR_TECHNICIANS);
  return { centre, spread: Math.sqrt(variance), freedom: members + PRIOR_TECHNICIANS - 1 };
};
