/** Items by their key, keys and items in the order in which they came. */
export const groupBy = <Item>(
  items: readonly Item[],
  keyOf: (item: Item, index: number) => string,
): Map<string, Item[]> => {
  const groups = new Map<string, Item[]>();
  items.forEach((item, index) => {
    const key = keyOf(item, index);
    const own = groups.get(key);
    if (own) own.push(item);
    else groups.set(key, [item]);
  });
  return groups;
};
