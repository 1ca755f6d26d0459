import { alg, Graph } from "@dagrejs/graphlib";
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { holds, putInOrder, type StandingCheck } from "@/lib/calc/check-graph";
import { orderChecks, scheduleChecks } from "@/lib/calc/sequence";
import { travelers } from "../../support/standing-checks";

const PACES = { inspection: 60, continuity: 120, "power-on": 300, function: 600, integration: null };
/** The median of the four stands in for the last. */
const SECONDS: Record<StandingCheck["stage"], number> = { ...PACES, integration: 210 };

/** What each open check must wait for, told as simply as possible: every open hold before it, every open prerequisite. */
function blockers(checks: readonly StandingCheck[]): Map<string, string[]> {
  const open = checks.filter(({ state }) => !holds(state));
  const before = (check: StandingCheck) =>
    open.filter(
      (one) =>
        check.needs.includes(one.id) ||
        (one.holdPoint && !one.lifted && one.unitId === check.unitId && one.position < check.position),
    );
  return new Map(open.map((check) => [check.id, before(check).map(({ id }) => id)]));
}

function library(edges: ReadonlyMap<string, readonly string[]>, weight: (id: string) => number = () => 1): Graph {
  const graph = new Graph({ directed: true });
  for (const id of edges.keys()) graph.setNode(id);
  for (const [id, needs] of edges) for (const need of needs) graph.setEdge(need, id, weight(need));
  return graph;
}

const digraphs = fc
  .array(fc.uniqueArray(fc.nat(9), { maxLength: 2 }), { minLength: 1, maxLength: 10 })
  .map(
    (drawn) => new Map(drawn.map((needs, at) => [`n${at}`, needs.filter((n) => n < drawn.length).map((n) => `n${n}`)])),
  );

describe("The order of any graph", () => {
  test("is there exactly when a graph library finds no circle, and breaks no edge", () => {
    fc.assert(
      fc.property(digraphs, (edges) => {
        const found = putInOrder(edges);
        expect(found.ok).toBe(alg.isAcyclic(library(edges)));
        if (!found.ok) return;
        expect([...found.order].sort()).toEqual([...edges.keys()].sort());
        for (const [id, needs] of edges) {
          for (const need of needs) expect(found.order.indexOf(need)).toBeLessThan(found.order.indexOf(id));
        }
      }),
    );
  });

  test("or a real way round, whose members the library puts into one component", () => {
    fc.assert(
      fc.property(digraphs, (edges) => {
        const found = putInOrder(edges);
        if (found.ok) return;
        const { circle } = found;
        expect(new Set(circle).size).toBe(circle.length);
        circle.forEach((id, at) => expect(edges.get(id)).toContain(circle[(at + 1) % circle.length]));
        const component = alg.findCycles(library(edges)).find((members) => members.includes(circle[0] ?? ""));
        for (const id of circle) expect(component).toContain(id);
      }),
    );
  });
});

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

describe("A plan", () => {
  const requests = fc.record({ builders: fc.constantFrom<1 | 2>(1, 2), seconds: fc.integer({ min: 0, max: 4000 }) });
  const plan = (checks: readonly StandingCheck[], request: { builders: 1 | 2; seconds: number }) => {
    const answer = scheduleChecks(checks, request, PACES);
    if (!answer.ok) throw new Error(answer.message);
    return answer.value;
  };

  test("begins no check before all that it waits for is done, and ends in time", () => {
    fc.assert(
      fc.property(travelers, requests, (checks, request) => {
        const { lines, left } = plan(checks, request);
        const edges = blockers(checks);
        const ends = new Map(lines.map(({ checkId, endS }) => [checkId, endS]));
        expect(ends.size).toBe(lines.length);
        expect(left).toBe(edges.size - lines.length);
        for (const { checkId, startS, endS } of lines) {
          expect(endS).toBeLessThanOrEqual(request.seconds);
          for (const need of edges.get(checkId) ?? []) expect(ends.get(need) ?? Infinity).toBeLessThanOrEqual(startS);
        }
      }),
    );
  });

  test("gives nobody two checks at once, no board to two people, and the rack to one", () => {
    fc.assert(
      fc.property(travelers, requests, (checks, request) => {
        const byId = new Map(checks.map((check) => [check.id, check]));
        const { lines } = plan(checks, request);
        for (const one of lines) {
          expect(one.builder).toBeLessThanOrEqual(request.builders);
          for (const other of lines) {
            if (one === other || one.endS <= other.startS || other.endS <= one.startS) continue;
            const [a, b] = [byId.get(one.checkId), byId.get(other.checkId)];
            expect(one.builder).not.toBe(other.builder);
            expect(a?.unitId).not.toBe(b?.unitId);
            expect([a?.stage, b?.stage]).not.toEqual(["integration", "integration"]);
          }
        }
      }),
    );
  });

  test("with time enough does everything: alone without a pause, together no faster than the longest chain", () => {
    fc.assert(
      fc.property(travelers, (checks) => {
        const work = checks.filter(({ state }) => !holds(state)).reduce((sum, { stage }) => sum + SECONDS[stage], 0);
        const [alone, together] = ([1, 2] as const).map((builders) => plan(checks, { builders, seconds: 1e6 }));
        expect(alone).toMatchObject({ left: 0, usedS: work });
        expect(together?.left).toBe(0);
        expect(together?.usedS).toBeLessThanOrEqual(work);
        expect(together?.usedS).toBeGreaterThanOrEqual(Math.max(work / 2, order(checks).critical?.totalS ?? 0));
      }),
    );
  });
});
