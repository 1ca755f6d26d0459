import { alg, Graph } from "@dagrejs/graphlib";
import fc from "fast-check";
import { expect, test } from "vitest";
import { isRailName, planProbes, PROBE_LIMIT_CLASSES, pointBook, type PlanOptions } from "@/lib/calc/continuity";
import type { Netlist, NetPoint } from "@/lib/calc/netlist";
import { anyBoard } from "../../support/simulated-board";

const [limits] = PROBE_LIMIT_CLASSES;
if (!limits) throw new Error("There are no limits.");
const bare: PlanOptions = { populated: false, limits };

const graphOf = (netlist: Netlist, kind: string) => {
  const { points } = pointBook(netlist);
  const graph = new Graph({ directed: false });
  points.forEach((_, at) => graph.setNode(String(at)));
  const probes = planProbes(netlist, bare).probes.filter((probe) => probe.kind === kind);
  for (const { a, b } of probes) graph.setEdge(String(a), String(b));
  return { graph, probes };
};

test("a net of n points takes n − 1 probes, which join all of its points and no others (components by a graph library)", () => {
  fc.assert(
    fc.property(anyBoard, (netlist) => {
      const { graph, probes } = graphOf(netlist, "continuity");
      const { netOf, points } = pointBook(netlist);
      expect(probes).toHaveLength(points.length - netlist.nets.length);
      const found = alg.components(graph).map((members) => members.map(Number).sort((a, b) => a - b));
      const nets = netlist.nets.map((_, net) => points.flatMap((_, at) => (netOf[at] === net ? [at] : [])));
      expect(found.sort((a, b) => (a[0] ?? 0) - (b[0] ?? 0))).toEqual(nets);
    }),
  );
});

/** Edge to edge, pads of 1 × 0.6 mm that lie straight. */
const areNear = (one: NetPoint, other: NetPoint, windowMm: number) => {
  const [dx, dy] = [Math.abs((one.xMm ?? 0) - (other.xMm ?? 0)), Math.abs((one.yMm ?? 0) - (other.yMm ?? 0))];
  const share = one.side === "both" || other.side === "both" || one.side === other.side;
  return share && Math.hypot(Math.max(0, dx - 1), Math.max(0, dy - 0.6)) <= windowMm;
};

test("isolation is probed between all nets with pads near each other and all rails, and nowhere else (brute force)", () => {
  fc.assert(
    fc.property(anyBoard, fc.constantFrom(0.4, 0.9, 1.27, 2, 4.3), (netlist, neighbourMm) => {
      const { points, netOf, netName } = pointBook(netlist);
      const expected = new Set<string>();
      points.forEach((one, a) => {
        points.forEach((other, b) => {
          const [from, to] = [netOf[a] ?? 0, netOf[b] ?? 0];
          const areRails = isRailName(netName(from)) && isRailName(netName(to));
          if (from < to && (areRails || areNear(one, other, neighbourMm))) expected.add(`${from} ${to}`);
        });
      });
      const { probes } = planProbes(netlist, { ...bare, neighbourMm });
      const found = probes
        .filter(({ kind }) => kind === "isolation")
        .map(({ a, b }) => [netOf[a] ?? 0, netOf[b] ?? 0].sort((one, other) => one - other).join(" "));
      expect(found.sort()).toEqual([...expected].sort());
    }),
    { numRuns: 300 },
  );
});

test("isolation of two nets is probed where they lie nearest", () => {
  fc.assert(
    fc.property(anyBoard, (netlist) => {
      const { points, netOf } = pointBook(netlist);
      const gap = (a: number, b: number) => {
        const [one, other] = [points[a], points[b]];
        if (!one || !other) return Infinity;
        const share = one.side === "both" || other.side === "both" || one.side === other.side;
        const [dx, dy] = [Math.abs((one.xMm ?? 0) - (other.xMm ?? 0)), Math.abs((one.yMm ?? 0) - (other.yMm ?? 0))];
        return share ? Math.hypot(Math.max(0, dx - 1), Math.max(0, dy - 0.6)) : Infinity;
      };
      for (const { kind, a, b } of planProbes(netlist, bare).probes) {
        if (kind === "continuity" || [a, b].every((at) => isRailName(pointBook(netlist).netName(netOf[at] ?? 0))))
          continue;
        points.forEach((_, one) => {
          points.forEach((_, other) => {
            if (netOf[one] === netOf[a] && netOf[other] === netOf[b]) {
              expect(gap(a, b)).toBeLessThanOrEqual(gap(one, other) + 1e-9);
            }
          });
        });
      }
    }),
    { numRuns: 50 },
  );
});

test("probes are numbered in their order, continuity first, and the saving is what the plan leaves out of all pairs", () => {
  fc.assert(
    fc.property(anyBoard, (netlist) => {
      const { probes, counts, everyPair, saved } = planProbes(netlist, bare);
      expect(probes.map(({ id }) => id)).toEqual(probes.map((_, at) => at));
      expect(probes.slice(0, counts.continuity).every(({ kind }) => kind === "continuity")).toBe(true);
      expect(probes).toHaveLength(counts.continuity + counts.isolation);
      const nets = netlist.nets.length;
      expect(everyPair).toBe((nets * (nets - 1)) / 2);
      expect(saved).toBe(everyPair - counts.isolation);
    }),
  );
});
