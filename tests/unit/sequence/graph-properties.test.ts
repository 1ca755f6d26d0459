import { alg } from "@dagrejs/graphlib";
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { putInOrder } from "@/lib/calc/check-graph";
import { library } from "../../support/open-blockers";

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
