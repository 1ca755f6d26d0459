import { describeCircle as describe, shortestWayRound } from "@/lib/calc/check-graph";
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
  const circle = shortestWayRound(start, (id) => edges.get(id) ?? []);
  return circle.length === 0 ? undefined : circle;
}

/** Of a circle that a change would close: "“A” would wait for “B”, which waits for “A”." */
export const describeCircle = (members: readonly { serial: string; title: string }[]): string =>
  describe(members, "would wait");
