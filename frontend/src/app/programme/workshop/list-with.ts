/** A list with one of its items changed. */
export const listWith = <Item>(list: readonly Item[], at: number, change: Partial<Item>): Item[] =>
  list.map((item, index) => (index === at ? { ...item, ...change } : item));

/** A list without one of its items. */
export const listWithout = <Item>(list: readonly Item[], at: number): Item[] => list.filter((_, index) => index !== at);
