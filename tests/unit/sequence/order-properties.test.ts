import { alg } from "@dagrejs/graphlib";
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import type { StandingCheck } from "@/lib/calc/check-graph";
import { orderChecks } from "@/lib/calc/sequence";
import { blockers, library, PACES, SECONDS } from "../../support/open-blockers";
import { travelers } from "../../support/standing-checks";

function order(checks: readonly StandingCheck[]) {
  const answer = orderChecks(checks, PACES);
  if (!answer.ok) throw new Error(answer.message);
  return answer.value;
}

describe("The order of the work", () => {
  test("names every open check once and breaks neither prerequisite nor hold; free is what nothing blocks", () => {
    fc.assert(
      fc.property(travelers, (checks) => {
        const edges = blockers(checks);
        const { open, now } = order(checks);
        const ids = open.map(({ checkId }) => checkId);
        expect([...ids].sort()).toEqual([...edges.keys()].sort());
        for (const [id, needs] of edges)
          for (const need of needs) expect(ids.indexOf(need)).toBeLessThan(ids.indexOf(id));
        expect([...now].sort()).toEqual([...edges].flatMap(([id, needs]) => (needs.length === 0 ? [id] : [])).sort());
        if (edges.size > 0) expect(now.length).toBeGreaterThan(0);
      }),
    );
  });

  test("counts behind each check what a graph library reaches from it", () => {
    fc.assert(
      fc.property(travelers, (checks) => {
        const graph = library(blockers(checks));
        for (const { checkId, holdsBack } of order(checks).open) {
          expect(holdsBack).toBe(alg.preorder(graph, [checkId]).length - 1);
        }
      }),
    );
  });

  test("has for its longest chain what a graph library finds as the shortest way with the times turned negative", () => {
    fc.assert(
      fc.property(travelers, (checks) => {
        const stage = new Map(checks.map((check) => [check.id, check.stage]));
        const seconds = (id: string) => SECONDS[stage.get(id) ?? "function"];
        const edges = blockers(checks);
        const graph = library(edges, (need) => -seconds(need));
        const ways = alg.floydWarshall(graph, (edge) => Number(graph.edge(edge)));
        const totals = [...edges.keys()].flatMap((from) =>
          [...edges.keys()].map((to) => -(ways[from]?.[to]?.distance ?? Infinity) + seconds(to)),
        );
        const { critical } = order(checks);
        if (edges.size === 0) {
          expect(critical).toBeNull();
          return;
        }
        expect(critical?.totalS).toBe(Math.max(...totals));
        critical?.steps.forEach(({ checkId, startS, expectedS }, at, steps) => {
          const next = steps[at + 1];
          expect(startS + expectedS).toBe(next?.startS ?? critical.totalS);
          if (next) expect(edges.get(next.checkId)).toContain(checkId);
        });
      }),
      { numRuns: 50 },
    );
  });
});
