/** Where a label would like to stand, in pixels from the top. */
export type Wish = { id: string; y: number };

/**
 * Moves labels apart so that each has `gap` pixels, keeping their order and all of them between `top` and `bottom`, as
 * near to where they belong as that allows. More labels than fit overlap at the top; the caller bounds their number.
 */
export const spreadLabels = (wishes: readonly Wish[], gap: number, top: number, bottom: number): Wish[] => {
  const fromBelow = [...wishes].sort((a, b) => b.y - a.y);
  let floor = bottom;
  const raised = fromBelow.map(({ id, y }) => {
    const placed = Math.min(y, floor);
    floor = placed - gap;
    return { id, y: placed };
  });
  // What was pushed out at the top comes back down, and pushes what stands below it.
  let ceiling = top;
  return raised.reverse().map(({ id, y }) => {
    const placed = Math.max(y, ceiling);
    ceiling = placed + gap;
    return { id, y: placed };
  });
};
