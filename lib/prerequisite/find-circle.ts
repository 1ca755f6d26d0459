import { nameCheck } from "@/lib/check/state-reason";
import { groupUnits } from "@/lib/check/unit-order";

type Placed = { id: string; unitId: string; position: number; holdPoint: boolean; needs: readonly string[] };

/** What each check waits for directly: its prerequisites and the hold point before it, lifted or not. */
export function waitsFor(checks: readonly Placed[]): Map<string, string[]> {
  const edges = new Map<string, string[]>();
  for (const unit of groupUnits(checks)) {
    let hold: string | undefined;
    for (const check of unit) {
      edges.set(check.id, hold === undefined ? [...check.needs] : [...check.needs, hold]);
      if (check.holdPoint) hold = check.id;
    }
  }
  return edges;
}

/** The shortest way from a check through what it waits for back to itself, the check first; undefined when there is none. */
export function findCircle(edges: ReadonlyMap<string, readonly string[]>, start: string): string[] | undefined {
  const cameFrom = new Map<string, string>();
  const queue = [start];
  for (let at = queue.shift(); at !== undefined; at = queue.shift()) {
    for (const next of edges.get(at) ?? []) {
      if (next === start) return wayBack(cameFrom, start, at);
      if (cameFrom.has(next)) continue;
      cameFrom.set(next, at);
      queue.push(next);
    }
  }
  return undefined;
}

function wayBack(cameFrom: ReadonlyMap<string, string>, start: string, end: string): string[] {
  const way = [end];
  for (let at = end; at !== start;) {
    const before = cameFrom.get(at);
    if (before === undefined) break;
    way.unshift(before);
    at = before;
  }
  return way;
}

/** "“A” would wait for “B”, which waits for “C” of TIM-01, which waits for “A”." */
export function describeCircle(members: readonly { serial: string; title: string }[]): string {
  const [first, ...rest] = members;
  if (!first) return "";
  const name = (check: { serial: string; title: string }) => nameCheck(check, first.serial);
  if (rest.length === 0) return `${name(first)} would wait for itself.`;
  return `${name(first)} would wait for ${[...rest, first].map(name).join(", which waits for ")}.`;
}
