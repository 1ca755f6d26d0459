import { describe, expect, it } from "vitest";
import { block, design, FULL_ADDER, NAND_ADDER, packed } from "../unit/packing/design";

const countOf = (part: string, packing: ReturnType<typeof packed>) =>
  packing.lines.filter((line) => line.part === part).reduce((sum, line) => sum + line.count, 0);

describe("gates to packages, common practice, no source", () => {
  it("a full adder takes 2 XOR, 2 AND and 1 OR; four bits fill five quad packages", () => {
    const packing = packed(design([FULL_ADDER], { "Full adder": 4 }));
    expect(packing.packageCount).toBe(5);
    expect(packing.gatesUsed).toBe(20);
    expect(packing.lines.map(({ part, count, spareGates }) => [part, count, spareGates])).toEqual([
      ["74HC86", 2, 0],
      ["74HC08", 2, 0],
      ["74HC32", 1, 0],
    ]);
    expect(packing.spares).toEqual([]);
  });

  it("five packages want five decoupling capacitors of 100 nF and one bulk capacitor", () => {
    const { decoupling } = packed(design([FULL_ADDER], { "Full adder": 4 }));
    expect(decoupling.packageCapacitors).toBe(5);
    expect(decoupling.packageFarad).toBe(100e-9);
    expect(decoupling.bulkCapacitors).toBe(1);
    expect(decoupling.rule).toContain("no source");
  });

  it("eight inversions in hex packages leave four spare", () => {
    const packing = packed(design([], {}, { loose: { inv: 8 } }));
    expect(packing.packageCount).toBe(2);
    expect(packing.spares).toHaveLength(4);
    expect(packing.spares.map((spare) => [spare.designator, spare.gate])).toEqual([
      ["U2", "C"],
      ["U2", "D"],
      ["U2", "E"],
      ["U2", "F"],
    ]);
  });
});

describe("adders of eight bits, computed", () => {
  it("of 5-gate cells: 16 XOR, 16 AND, 8 OR are 40 gates in 4 + 4 + 2 packages", () => {
    const packing = packed(design([FULL_ADDER], { "Full adder": 8 }));
    expect(packing.gatesUsed).toBe(40);
    expect(["74HC86", "74HC08", "74HC32"].map((part) => countOf(part, packing))).toEqual([4, 4, 2]);
    expect(packing.packageCount).toBe(10);
  });

  it("of 9-NAND cells: 72 NAND are 18 packages", () => {
    expect(packed(design([NAND_ADDER], { "NAND adder": 8 })).packageCount).toBe(18);
  });

  it("of XOR and a NAND-NAND carry: 16 XOR and 24 NAND are 4 + 6 packages", () => {
    const cell = block("XOR and NAND", { xor2: 2, nand2: 3 });
    expect(packed(design([cell], { "XOR and NAND": 8 })).packageCount).toBe(10);
  });

  it("that also subtract take 8 XOR more: 6 + 4 + 2 = 12 packages", () => {
    const adder = block("Adder", {}, { "Full adder": 8 });
    const packing = packed(design([FULL_ADDER, adder], { Adder: 1 }, { loose: { xor2: 8 } }));
    expect(["74HC86", "74HC08", "74HC32"].map((part) => countOf(part, packing))).toEqual([6, 4, 2]);
    expect(packing.packageCount).toBe(12);
  });

  it.each([1, 5, 6, 7, 12, 13])("%i inverters take ⌈n/6⌉ packages", (count) => {
    expect(packed(design([], {}, { loose: { inv: count } })).packageCount).toBe(Math.ceil(count / 6));
  });

  it("kept per cell, four full adders take twelve packages; sharing saves seven", () => {
    const packing = packed(design([FULL_ADDER], { "Full adder": 4 }, { mode: "per-block" }));
    expect(packing.packageCount).toBe(12);
    expect(packing.poolingSaves).toBe(7);
    expect(packing.lowerBound).toBe(5);
    expect(packing.lines.every((line) => line.forBlock === "Full adder")).toBe(true);
  });
});
