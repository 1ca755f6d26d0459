import { expect, test } from "vitest";
import type { DesignPin } from "@/lib/calc/interconnect";
import { netlistOfDesign, pinName } from "@/lib/calc/netlist";
import { face } from "../../support/face";

const pin = (name: string, signal: string): DesignPin => ({
  pin: name,
  signal,
  role: "passive",
  family: "",
  loads: 0,
  enableGroup: "",
  pullUpOhm: null,
});

const c64 = face("din41612-c64");

test("pins of one board with the same signal are one net, whichever connector they stand on", () => {
  const netlist = netlistOfDesign({
    connectors: [
      { id: "1", reference: "X1", face: c64, pins: [pin("A1", "GND"), pin("a2", "D0"), pin("c2", "")] },
      { id: "2", reference: "X2", face: c64, pins: [pin("a1", "GND"), pin("a2", "D1"), pin("a2", "D1")] },
    ],
  });
  expect(netlist.nets.map(({ name, points }) => [name, points.map(pinName)])).toEqual([
    ["GND", ["X1-a1", "X2-a1"]],
    ["D0", ["X1-a2"]],
    ["D1", ["X2-a2"]],
  ]);
  expect(netlist.unconnected.map(pinName)).toEqual(["X1-c2"]);
});

test("places are those of the faces, set side by side; a pin that the face lacks has none", () => {
  const pins = [pin("a1", "A"), pin("a2", "B"), pin("z9", "C")];
  const netlist = netlistOfDesign({
    connectors: ["X1", "X2"].map((reference) => ({ id: reference, reference, face: c64, pins })),
  });
  expect(netlist.places).toBe("faces");
  const [first, second] = netlist.nets[0]?.points ?? [];
  const [below] = netlist.nets[1]?.points ?? [];
  expect((first?.yMm ?? 0) - (below?.yMm ?? 0)).toBeCloseTo(2.54, 9);
  expect((second?.xMm ?? 0) - (first?.xMm ?? 0)).toBeGreaterThan(20);
  expect(netlist.nets[2]?.points[0]).toMatchObject({ pin: "z9", xMm: null, yMm: null });
});
