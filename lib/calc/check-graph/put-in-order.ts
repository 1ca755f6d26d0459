/** What waits for what, by id. Every id that is waited for is a key. */
export type Edges = ReadonlyMap<string, readonly string[]>;

/** The edges turned round: what waits for each, in the order of the keys. */
export function turnedRound(edges: Edges): Map<string, string[]> {
  const turned = new Map([...edges.keys()].map((id): [string, string[]] => [id, []]));
  for (const [id, needs] of edges) for (const need of needs) turned.get(need)?.push(id);
  return turned;
}

/** All ids in an order in which none comes before what it waits for, or the members of a circle. */
export type InOrder = { ok: true; order: string[] } | { ok: false; circle: string[] };

/**
 * Kahn's order (Topological sorting of large networks, Comm. ACM 5, 1962): the free ones in the order of the keys, the
 * others as they come free. Linear in ids and edges.
 */
export function putInOrder(edges: Edges): InOrder {
  const waits = new Map([...edges].map(([id, needs]) => [id, needs.length]));
  const behind = turnedRound(edges);
  const order = [...waits].flatMap(([id, count]) => (count === 0 ? [id] : []));
  // Grows while it is read.
  for (const id of order) {
    for (const next of behind.get(id) ?? []) {
      const left = (waits.get(next) ?? 0) - 1;
      waits.set(next, left);
      if (left === 0) order.push(next);
    }
  }
  return order.length === waits.size ? { ok: true, order } : { ok: false, circle: findCircle(edges, new Set(order)) };
}

/** Members in order: each waits for the next, the last for the first. The first key of the shortest way round comes first. */
function findCircle(edges: Edges, free: ReadonlySet<string>): string[] {
  const stuck = (id: string) => (edges.get(id) ?? []).filter((need) => !free.has(need));
  const seen = new Set<string>();
  let at = [...edges.keys()].find((id) => !free.has(id));
  // Whoever is stuck waits for somebody who is stuck: following them ends in a circle.
  while (at !== undefined && !seen.has(at)) {
    seen.add(at);
    at = stuck(at)[0];
  }
  return at === undefined ? [] : firstKeyFirst(shortestWayRound(at, stuck), edges);
}

/** The shortest way from an id through what it waits for back to itself, the id first; empty when there is none. */
export function shortestWayRound(start: string, waitsFor: (id: string) => readonly string[]): string[] {
  const cameFrom = new Map<string, string>();
  const queue = [start];
  for (const at of queue) {
    for (const next of waitsFor(at)) {
      if (next === start) return wayFrom(start, at, cameFrom);
      if (cameFrom.has(next)) continue;
      cameFrom.set(next, at);
      queue.push(next);
    }
  }
  return [];
}

function wayFrom(start: string, end: string, cameFrom: ReadonlyMap<string, string>): string[] {
  const way: string[] = [];
  for (let at: string | undefined = end; at !== undefined && at !== start; at = cameFrom.get(at)) way.push(at);
  return [start, ...way.reverse()];
}

function firstKeyFirst(circle: string[], edges: Edges): string[] {
  const members = new Set(circle);
  const first = [...edges.keys()].find((id) => members.has(id));
  const at = first === undefined ? 0 : circle.indexOf(first);
  return [...circle.slice(at), ...circle.slice(0, at)];
}
