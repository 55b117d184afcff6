/**
 * The least number between `low` and `high` at which `count` reaches `rank`, exact to the last bit where `count` rises
 * in steps at the numbers sought. `count(high)` must reach it.
 */
export const leastReaching = (rank: number, low: number, high: number, count: (bound: number) => number): number => {
  if (count(low) >= rank) return low;
  let [below, reached] = [low, high];
  for (;;) {
    const middle = below + (reached - below) / 2;
    if (middle <= below || middle >= reached) return reached;
    if (count(middle) >= rank) reached = middle;
    else below = middle;
  }
};
