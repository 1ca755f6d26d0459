import { describe, expect, it } from "vitest";
import { aroundOf, insideOf, timesInside } from "@/lib/block/block-graph";
import { gatesInside } from "@/lib/block/gates-inside";
import { outdatedUnits } from "@/lib/block/outdated-units";
import { boardParts } from "@/lib/board-plan/board-parts";
import { designatorClashes, readDesignators } from "@/lib/board-plan/designators";
import { tieCheck } from "@/lib/board-plan/tie-check";
import { pastedLines } from "@/components/parts/pasted-lines";
import type { SpareGate } from "@/lib/calc/packing";
import { checkFields } from "@/lib/procedure/schema";

/** accumulator holds 24 bits, a bit holds one adder; the sum holds 4 adders. */
const HOLDINGS = [
  { blockId: "accumulator", childId: "bit", count: 24 },
  { blockId: "bit", childId: "adder", count: 1 },
  { blockId: "sum", childId: "adder", count: 4 },
];

describe("blocks inside blocks", () => {
  it("are found inwards and outwards, and counted through", () => {
    expect([...insideOf(HOLDINGS, ["accumulator"])]).toEqual(["accumulator", "bit", "adder"]);
    expect([...aroundOf(HOLDINGS, "adder")].sort()).toEqual(["accumulator", "adder", "bit", "sum"]);
    expect(timesInside(HOLDINGS, "accumulator", "adder")).toBe(24);
    expect(timesInside(HOLDINGS, "sum", "bit")).toBe(0);
  });

  it("add up their gates, most of a kind first", () => {
    const gates = [{ gateFunction: "or2", count: 1 }];
    const more = [{ gateFunction: "xor2", count: 2 }];
    expect(
      gatesInside([
        { gates, times: 3 },
        { gates: more, times: 4 },
      ]),
    ).toEqual([
      { gateFunction: "xor2", name: "2-input exclusive OR", count: 8 },
      { gateFunction: "or2", name: "2-input OR", count: 3 },
    ]);
  });
});

describe("a unit", () => {
  const day = (date: number) => new Date(Date.UTC(2026, 1, date));
  const rows = {
    blocks: [{ id: "adder", name: "Full adder", createdAt: day(1), changedAt: day(10) }],
    holdings: [{ blockId: "sum", childId: "adder", count: 4 }],
    uses: [{ boardId: "SUM", blockId: "sum" }],
    units: [
      { boardId: "SUM", serial: "SUM-01", createdAt: day(5) },
      { boardId: "SUM", serial: "SUM-02", createdAt: day(12) },
      { boardId: "OUT", serial: "OUT-01", createdAt: day(5) },
    ],
  };

  it("is outdated when a block of its board changed after it was built, however deep", () => {
    expect(outdatedUnits(rows).map(({ serial, block }) => [serial, block.name])).toEqual([["SUM-01", "Full adder"]]);
  });

  it("is not, while the block is as it was first written down", () => {
    const blocks = rows.blocks.map((block) => ({ ...block, changedAt: block.createdAt }));
    const units = [{ boardId: "SUM", serial: "SUM-00", createdAt: new Date(0) }];
    expect(outdatedUnits({ ...rows, blocks, units })).toEqual([]);
  });
});

describe("designators", () => {
  it("read singly and in ranges, with either dash", () => {
    expect(readDesignators("R1–R3, C7")).toEqual(["R1", "R2", "R3", "C7"]);
    expect(readDesignators("d1-d2 SW0")).toEqual(["D1", "D2", "SW0"]);
    expect(readDesignators("R1-3")).toEqual(["R1", "R2", "R3"]);
    expect(readDesignators("")).toEqual([]);
    expect(["by the edge", "R3–R1", "R1–C3", "R1–R9999"].map(readDesignators)).toEqual([
      undefined,
      undefined,
      undefined,
      undefined,
    ]);
  });

  it("that name two things, or another number than the count, are told", () => {
    const lines = [
      { partNumber: "Memory", count: 2, designators: "U1, U2" },
      { partNumber: "470 Ω", count: 7, designators: "R1–R8" },
      { partNumber: "LED", count: 1, designators: "" },
    ];
    expect(designatorClashes(lines, [{ designator: "U1", part: "74HC86" }])).toEqual([
      "U1 names the 74HC86 of the blocks and Memory.",
      "470 Ω: R1–R8 are 8, the count says 7.",
    ]);
    expect(designatorClashes(lines.slice(2), [])).toEqual([]);
  });
});

it("a board without blocks is made of its other parts alone", () => {
  const line = { partNumber: "XO", description: "", count: 1, designators: "Y1" };
  expect(boardParts(null, [line])).toEqual([{ part: "XO", description: "", count: 1, designators: "Y1" }]);
});

describe("the check of the ties", () => {
  const spare = (index: number): SpareGate => ({
    designator: `U${index}`,
    part: "74HC86",
    gate: "D",
    gateFunction: "xor2",
    inputCount: 2,
    tieLow: [12, 13],
    tieHigh: [],
    leaveOpen: [11],
    sentence: `U${index} gate D (74HC86): pins 12 and 13 to ground, pin 11 stays open.`,
  });

  it("lists every tie, in a form that the procedure editor takes", () => {
    const check = tieCheck("SUM", [spare(1), spare(2)]);
    expect(checkFields.safeParse(check).success).toBe(true);
    expect(check.instruction.split("\n").slice(1)).toEqual([spare(1).sentence, spare(2).sentence]);
  });

  it("says where the rest stands when they are too many for an instruction", () => {
    const many = Array.from({ length: 300 }, (_, index) => spare(index + 1));
    const check = tieCheck("SUM", many);
    expect(checkFields.safeParse(check).success).toBe(true);
    const listed = check.instruction.split("\n").length - 2;
    expect(check.instruction).toContain(`… and ${300 - listed} more, listed in the plan of SUM.`);
  });
});

describe("rows from a spreadsheet", () => {
  it("are taken with their count first, or without one", () => {
    expect(pastedLines("8\tLED\tPhase lamps\tD1–D8\r\n\r\nXO\tOscillator\r\n")).toEqual([
      { count: "8", partNumber: "LED", description: "Phase lamps", designators: "D1–D8" },
      { count: "1", partNumber: "XO", description: "Oscillator", designators: "" },
    ]);
  });

  it("that are one word stay what one pastes into a field", () => {
    expect(pastedLines("74HC00")).toBeUndefined();
    expect(pastedLines("74HC00\n")).toBeUndefined();
  });

  it("keep a count that is none, so that the form can say what is wrong with it", () => {
    expect(pastedLines("-2\tLED")?.[0]?.count).toBe("-2");
    expect(pastedLines("1.5\tLED")?.[0]?.count).toBe("1.5");
  });
});
