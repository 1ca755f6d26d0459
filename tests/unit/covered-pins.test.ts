import { describe, expect, it } from "vitest";
import { coveredPins } from "@/lib/board/covered-pins";
import { findConnector } from "@/lib/calc/connector";

function connector(id: string) {
  const found = findConnector(id);
  if (!found) throw new Error(`no connector ${id}`);
  return found;
}

describe("The pins that checks cover", () => {
  const edge = connector("din41612-c64");

  it("stand in the order of the connector, each with every check that names it", () => {
    const checks = [
      { title: "Clock runs", pins: ["J1 a4"] },
      { title: "Ground is one net", pins: ["J1 c32", "a4"] },
    ];
    expect(coveredPins(edge, "J1", checks)).toEqual([
      { pin: "a4", checks: ["Clock runs", "Ground is one net"] },
      { pin: "c32", checks: ["Ground is one net"] },
    ]);
  });

  it("count once a check that names the same pin in two ways", () => {
    expect(coveredPins(edge, "J1", [{ title: "Clock runs", pins: ["J1 a4", "A4"] }])).toEqual([
      { pin: "a4", checks: ["Clock runs"] },
    ]);
  });

  it("leave out pins of another connector and pins that this one does not have", () => {
    expect(coveredPins(edge, "J1", [{ title: "Front panel", pins: ["J2 a4", "b4", "a33"] }])).toEqual([]);
  });

  it("of a header go by the numbers on its pins", () => {
    expect(coveredPins(connector("header-2x5"), "J2", [{ title: "Pen", pins: ["J2 10", "3"] }])).toEqual([
      { pin: "3", checks: ["Pen"] },
      { pin: "10", checks: ["Pen"] },
    ]);
  });
});
