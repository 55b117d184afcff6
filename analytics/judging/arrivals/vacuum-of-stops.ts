import { STOPS_AT, type Stories } from './likelihood';
import { PRIOR, type SeenPull } from './prior';

/** A probability that moves no sum. */
const NOTHING = 1e-6;
/** With less lost than this an early stop could not be told from a leak, and leaks would pass for stops. */
const LEAST_LOSS = 0.3;
const MOST_LOSS = 2.5;

/** How much of the vacuum early stops miss, and how widely theirs spread: weighted least squares over where they stopped. */
export const vacuumOfStops = (pulls: readonly SeenPull[], stories: readonly Stories[]) => {
  let [cross, square] = [PRIOR.vacuumLoss.value * PRIOR.vacuumLoss.weight, PRIOR.vacuumLoss.weight as number];
  const each = (visit: (weight: number, z: number, reach: number) => void) =>
    pulls.forEach(({ vacuum }, i) => {
      const story = stories[i];
      if (vacuum && story && story.stopped > NOTHING)
        story.stoppedAt.forEach((weight, at) => {
          visit(weight, vacuum.z, vacuum.usual * (1 - (STOPS_AT[at] ?? 0)));
        });
    });
  each((weight, z, reach) => {
    cross -= weight * z * reach;
    square += weight * reach * reach;
  });
  const vacuumLoss = Math.min(MOST_LOSS, Math.max(LEAST_LOSS, cross / square));
  let [squares, weights] = [
    PRIOR.stoppedSpread.value ** 2 * PRIOR.stoppedSpread.pulls,
    PRIOR.stoppedSpread.pulls as number,
  ];
  each((weight, z, reach) => {
    squares += weight * (z + vacuumLoss * reach) ** 2;
    weights += weight;
  });
  return { vacuumLoss, stoppedSpread: Math.max(0.9, Math.sqrt(squares / weights)) };
};
