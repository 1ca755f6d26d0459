/** The parent holds the child so many times. */
export type Holding = { blockId: string; childId: string; count: number };

/** The given blocks and everything inside them. */
export const insideOf = (holdings: readonly Holding[], start: Iterable<string>): Set<string> =>
  reach(start, (id) => holdings.filter(({ blockId }) => blockId === id).map(({ childId }) => childId));

/** The given block and everything that has it inside. */
export const aroundOf = (holdings: readonly Holding[], start: string): Set<string> =>
  reach([start], (id) => holdings.filter(({ childId }) => childId === id).map(({ blockId }) => blockId));

function reach(start: Iterable<string>, onward: (id: string) => string[]): Set<string> {
  const reached = new Set(start);
  for (const id of reached) for (const next of onward(id)) reached.add(next);
  return reached;
}

/** How many times `inner` is in one `outer`, however deep. The blocks must be free of circles. */
export function timesInside(holdings: readonly Holding[], outer: string, inner: string): number {
  const known = new Map<string, number>([[inner, 1]]);
  const times = (id: string): number => {
    const before = known.get(id);
    if (before !== undefined) return before;
    const own = holdings
      .filter(({ blockId }) => blockId === id)
      .reduce((sum, { childId, count }) => sum + count * times(childId), 0);
    known.set(id, own);
    return own;
  };
  return times(outer);
}
