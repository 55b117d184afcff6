import type { Dimension } from '@/analytics/dimensions';
import type { StackLayer } from '@/analytics/monthly-trends/series';
import { COLOURED_REFRIGERANTS, refrigerantColour } from '@/lib/colour/refrigerant-colour';

const REST = 'var(--refrigerant-other)';

/** Hues for what has no colour of its own, in an order in which neighbours differ. */
const HUES = ['R-134a', 'R-404A', 'R-454B', 'R-410A', 'R-32', 'R-407C', 'R-22', 'R-513A'].map(refrigerantColour);

/**
 * The colour of each layer by its id. A refrigerant has the same one everywhere; a rare one that borrows a colour takes
 * another when that is already in the picture.
 */
export const layerColours = (by: Dimension, layers: readonly StackLayer[]): Record<string, string> => {
  const taken = new Set<string>();
  const owned = by === 'refrigerant' ? COLOURED_REFRIGERANTS.map(refrigerantColour) : HUES;
  const colours: Record<string, string> = {};
  for (const { id, key } of layers) {
    const wanted = key === null ? REST : by === 'refrigerant' ? refrigerantColour(key) : undefined;
    const colour = wanted && !taken.has(wanted) ? wanted : (owned.find((hue) => !taken.has(hue)) ?? REST);
    colours[id] = colour;
    taken.add(colour);
  }
  return colours;
};
