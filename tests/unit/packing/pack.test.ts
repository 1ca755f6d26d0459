import { describe, expect, test } from "vitest";
import { groupSpares } from "@/lib/calc/packing";
import { block, design, FULL_ADDER, packed, partNumbered, problemsOf } from "./design";

describe("the allocation of gates", () => {
  test("keeps the gates of one adder together and names whose they are", () => {
    const packing = packed(design([FULL_ADDER], { "Full adder": 3 }));
    expect(packing.packages.map((one) => [one.designator, one.part])).toEqual([
      ["U1", "74HC86"],
      ["U2", "74HC86"],
      ["U3", "74HC08"],
      ["U4", "74HC08"],
      ["U5", "74HC32"],
    ]);
    expect(packing.packages[1]?.gates).toEqual([
      { gate: "A", inputs: [1, 2], outputs: [3], usedBy: "Full adder 3 of 3" },
      { gate: "B", inputs: [4, 5], outputs: [6], usedBy: "Full adder 3 of 3" },
      { gate: "C", inputs: [9, 10], outputs: [8], usedBy: null },
      { gate: "D", inputs: [12, 13], outputs: [11], usedBy: null },
    ]);
  });

  test("says which pins of a spare gate go where, so that a rework can use it", () => {
    const { spares } = packed(design([FULL_ADDER], { "Full adder": 3 }));
    expect(spares.at(-1)).toMatchObject({
      designator: "U5",
      gate: "D",
      part: "74HC32",
      tieLow: [12, 13],
      leaveOpen: [11],
    });
    expect(spares.at(-1)?.sentence).toBe("U5 gate D (74HC32): pins 12 and 13 to ground, pin 11 stays open.");
    expect(groupSpares(spares, "HC")).toEqual([
      { part: "74HC86", gates: 2, inputs: 4, family: "HC" },
      { part: "74HC08", gates: 2, inputs: 4, family: "HC" },
      { part: "74HC32", gates: 1, inputs: 2, family: "HC" },
    ]);
  });

  test("a spare flip-flop is neither set nor reset: those pins go to the rail", () => {
    const { spares } = packed(design([], {}, { loose: { dff: 1 } }));
    expect(spares[0]?.sentence).toBe(
      "U1 gate B (74HC74): pins 11 and 12 to ground, pins 10 and 13 to the rail, pins 8 and 9 stay open.",
    );
  });

  test("a spare three-state buffer is switched off", () => {
    const { spares } = packed(design([], {}, { loose: { "buffer-three-state": 3 } }));
    expect(spares[0]).toMatchObject({ tieLow: [12], tieHigh: [13], leaveOpen: [11] });
  });

  test("a bipolar input goes to the rail through a resistor", () => {
    const input = { ...design([], {}, { loose: { dff: 1 } }), family: { name: "LS", technology: "bipolar" as const } };
    expect(packed(input).spares[0]?.sentence).toContain("pins 10 and 13 to the rail through 1 kΩ");
  });

  test("a part of the project's own whose pins nobody entered still says what its spares want", () => {
    const own = { ...partNumbered("00"), number: "QUAD-7", pinout: null };
    const { spares, packages } = packed(design([], {}, { loose: { nand2: 3 }, own: [own] }));
    expect(packages[0]?.part).toBe("QUAD-7");
    expect(spares[0]?.sentence).toBe("U1 gate D (QUAD-7): its 2 inputs to ground, outputs stay open.");
  });

  test("gates with one select between them are told when blocks share them", () => {
    const selector = block("Selector", { mux2: 2 });
    expect(packed(design([selector], { Selector: 2 })).notes).toEqual([
      "All gates of a 74HC157 share pins 1 and 15. Blocks with another select or enable need a package of their own.",
    ]);
    expect(packed(design([selector], { Selector: 2 }, { mode: "per-block" })).notes).toEqual([]);
  });

  test("an empty board takes nothing", () => {
    const packing = packed(design([], {}));
    expect(packing).toMatchObject({ packageCount: 0, lines: [], spares: [], poolingSaves: 0 });
    expect(packing.decoupling).toMatchObject({ packageCapacitors: 0, bulkCapacitors: 0 });
  });
});

describe("a design that cannot be packed", () => {
  const messages = (input: Parameters<typeof problemsOf>[0]) => problemsOf(input).map((problem) => problem.message);

  test("names the members of a cycle in order", () => {
    const cycle = [
      block("Adder", {}, { Carry: 1 }),
      block("Carry", {}, { Chain: 1 }),
      block("Chain", {}, { Adder: 1 }),
    ];
    expect(messages(design(cycle, { Adder: 1 }))).toEqual([
      "Blocks contain each other: Adder → Carry → Chain → Adder. Take one of them out of the one before it.",
    ]);
    expect(messages(design([block("Adder", {}, { Adder: 1 })], { Adder: 1 }))[0]).toContain("contains itself");
  });

  test("finds a cycle that the board does not even use", () => {
    const cycle = [FULL_ADDER, block("A", {}, { B: 1 }), block("B", {}, { A: 1 })];
    expect(messages(design(cycle, { "Full adder": 1 }))[0]).toContain("A → B → A");
  });

  test.each([0, -1, 2.5, NaN, Infinity])("a count of %s names its row", (count) => {
    const [problem] = problemsOf(design([block("Adder", { xor2: count })], { Adder: 1 }));
    expect(problem?.row).toBe("block:Adder/gates/0");
    expect(problem?.message).toContain("Block “Adder”, “2-input exclusive OR”");
    expect(problemsOf(design([FULL_ADDER], { "Full adder": count }))[0]?.row).toBe("board/use/0");
  });

  test("an unknown block or function names its row", () => {
    expect(problemsOf(design([FULL_ADDER], { Subtractor: 1 }))).toEqual([
      { row: "board/use/0", message: "Board, row 1: there is no block “Subtractor”." },
    ]);
    expect(problemsOf(design([], {}, { loose: { teapot: 1 } }))).toEqual([
      {
        row: "board/loose/0",
        message: "Board, loose gates: no part is chosen for “teapot”. Choose one, or add your own.",
      },
    ]);
  });

  test("a function without a part keeps only the boards that use it from being packed", () => {
    const blocks = [FULL_ADDER, block("Odd", { teapot: 1 })];
    expect(packed(design(blocks, { "Full adder": 4 })).packageCount).toBe(5);
    expect(problemsOf(design(blocks, { Odd: 1 }))[0]?.row).toBe("block:Odd/gates/0");
  });

  test("nested counts that come to millions are refused at once", () => {
    const blocks = [block("0", { nand2: 10_000 })];
    for (let level = 1; level < 30; level++) blocks.push(block(String(level), {}, { [String(level - 1)]: 10_000 }));
    expect(messages(design(blocks, { "29": 1 }))[0]).toContain("more than 20000 gates");
  });

  test("a chain of thousands of blocks neither ends the stack nor takes long", () => {
    const blocks = [block("0", { nand2: 1 })];
    for (let level = 1; level < 5000; level++) blocks.push(block(String(level), {}, { [String(level - 1)]: 1 }));
    expect(packed(design(blocks, { "4999": 1 })).packageCount).toBe(1);
  });
});
