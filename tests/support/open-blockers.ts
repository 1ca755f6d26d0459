import { Graph } from "@dagrejs/graphlib";
import { holds, type StandingCheck } from "@/lib/calc/check-graph";

export const PACES = { inspection: 60, continuity: 120, "power-on": 300, function: 600, integration: null };
/** The median of the four stands in for the last. */
export const SECONDS: Record<StandingCheck["stage"], number> = { ...PACES, integration: 210 };

/** What each open check must wait for, told as simply as possible: every open hold before it, every open prerequisite. */
export function blockers(checks: readonly StandingCheck[]): Map<string, string[]> {
  const open = checks.filter(({ state }) => !holds(state));
  const before = (check: StandingCheck) =>
    open.filter(
      (one) =>
        check.needs.includes(one.id) ||
        (one.holdPoint && !one.lifted && one.unitId === check.unitId && one.position < check.position),
    );
  return new Map(open.map((check) => [check.id, before(check).map(({ id }) => id)]));
}

/** The same for a graph library: from what is waited for to who waits. */
export function library(
  edges: ReadonlyMap<string, readonly string[]>,
  weight: (id: string) => number = () => 1,
): Graph {
  const graph = new Graph({ directed: true });
  for (const id of edges.keys()) graph.setNode(id);
  for (const [id, needs] of edges) for (const need of needs) graph.setEdge(need, id, weight(need));
  return graph;
}
