import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { describeCircle, findCircle, waitsFor } from "@/lib/prerequisite/find-circle";
import { machines } from "../check/histories";

describe("a circle of checks", () => {
  it("is found by its shortest way and told in order", () => {
    const edges = new Map([
      ["a", ["x", "b"]],
      ["x", ["y"]],
      ["y", ["z"]],
      ["z", ["a"]],
      ["b", ["a"]],
    ]);
    expect(findCircle(edges, "a")).toEqual(["a", "b"]);
    const named = ["A", "B", "C"].map((title) => ({ serial: title === "B" ? "TIM-01" : "PSU-01", title }));
    expect(describeCircle(named)).toBe("“A” would wait for “B” of TIM-01, which waits for “C”, which waits for “A”.");
    expect(describeCircle(named.slice(0, 1))).toBe("“A” would wait for itself.");
  });

  it("goes through hold points of the unit as well", () => {
    const unit = [
      { id: "hold", unitId: "u", position: 1, holdPoint: true, needs: ["late"] },
      { id: "late", unitId: "u", position: 2, holdPoint: false, needs: [] },
    ];
    expect(findCircle(waitsFor(unit), "late")).toEqual(["late", "hold"]);
  });

  it("is not seen where every check needs only what came before it, and is closed by any edge back", () => {
    fc.assert(
      fc.property(machines, fc.nat(), (machine, pick) => {
        const edges = waitsFor(machine);
        for (const { id } of machine) expect(findCircle(edges, id)).toBeUndefined();
        const end = machine[pick % Math.max(1, machine.length)];
        const start = end && (edges.get(end.id) ?? [])[0];
        if (!end || !start) return;
        const closed = new Map(edges).set(start, [...(edges.get(start) ?? []), end.id]);
        expect(findCircle(closed, end.id)).toContain(start);
      }),
    );
  });
});
