import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { rippleCarrySteps, stepOfPart } from "@/lib/calc/delay";
import { findPart } from "@/lib/calc/logic-parts";
import { delayOf, derated, messageOf, NS, path, step } from "./path";

describe("a chain of parts", () => {
  test("adds up lowest, typical and highest delays, and the root of the squares beside them", () => {
    const delay = delayOf(path([step("74HC86", 1, 3, 11, 24), step("74HC08", 4, 2, 7, 18)]));
    expect(delay.minS).toBeCloseTo(11 * NS, 15);
    expect(delay.typicalS).toBeCloseTo(39 * NS, 15);
    expect(delay.worstCaseS).toBeCloseTo(96 * NS, 15);
    // computed: 39 + √(13² + 4 · 11²) = 39 + √653
    expect(delay.rootSumSquareS).toBeCloseTo((39 + Math.sqrt(653)) * NS, 15);
    expect(delay.notes).toEqual([]);
  });

  test("leaves open what is not known and says so", () => {
    const delay = delayOf(path([step("74HC86", 1, null, 11, 24), step("74HC32", 1, null, 6, null)]));
    expect(delay).toMatchObject({ minS: null, worstCaseS: null, rootSumSquareS: null });
    expect(delay.notes).toEqual([
      "No lowest delay is known of 74HC86, 74HC32: the sum is open below.",
      "No highest delay is known of 74HC32: there is no worst case.",
    ]);
  });

  test("takes a share of the typical delay only where one is given, and says so", () => {
    const shares = { unknownMinShare: 0.25, unknownMaxShare: 2 };
    const delay = delayOf(path([step("74HC86", 1, null, 12, 24), step("74HC32", 2, null, 6, null)], shares));
    expect(delay.minS).toBeCloseTo(6 * NS, 15);
    expect(delay.worstCaseS).toBeCloseTo(48 * NS, 15);
    expect(delay.notes.join(" ")).toContain("Highest delay of 74HC32: 2 times the typical one, an assumption.");
  });

  test("a part with a highest delay alone counts with it, but lends no share to the lowest", () => {
    const delay = delayOf(path([step("GAL", 1, null, null, 15)], { unknownMinShare: 0.25 }));
    expect(delay).toMatchObject({ minS: null, typicalS: 15e-9, worstCaseS: 15e-9 });
    expect(delay.notes.join(" ")).toContain("No typical delay is known of GAL");
  });

  test("whatever the chain, lowest ≤ typical ≤ root-sum-square ≤ worst case", () => {
    const steps = fc.array(
      fc
        .tuple(
          fc.integer({ min: 1, max: 64 }),
          fc.array(fc.integer({ min: 0, max: 500 }), { minLength: 3, maxLength: 3 }),
        )
        .map(([count, delays]) => {
          const [min = 0, typical = 0, max = 0] = [...delays].sort((a, b) => a - b);
          return step("part", count, min, typical, max);
        }),
      { minLength: 1, maxLength: 12 },
    );
    const board = fc.record({
      volts: fc.double({ min: 4.5, max: 5.5, noNaN: true }),
      loadPf: fc.integer({ min: 0, max: 500 }),
    });
    const derating = fc.option(board.map((at) => derated("HC", at)));
    fc.assert(
      fc.property(steps, derating, (chain, conditions) => {
        const delay = delayOf(path(chain, { derating: conditions }));
        const rootSumSquare = delay.rootSumSquareS ?? NaN;
        expect(delay.minS).toBeLessThanOrEqual(delay.typicalS);
        expect(delay.typicalS).toBeLessThanOrEqual(rootSumSquare);
        expect(rootSumSquare).toBeLessThanOrEqual(delay.worstCaseS ?? NaN);
      }),
    );
  });
});

describe("a path that cannot be added up names its row", () => {
  test.each([0, -1, 1.5, NaN, 10_001])("a count of %s", (count) => {
    expect(messageOf(path([step("A", 1, 1, 2, 3), step("B", count, 1, 2, 3)]))).toContain("steps/1: Step 2 (B)");
  });
  test("delays out of order, below zero or missing", () => {
    expect(messageOf(path([step("A", 1, 5, 2, 9)]))).toContain("the typical delay is below the lowest one");
    expect(messageOf(path([step("A", 1, 5, null, 4)]))).toContain("the highest delay is below the lowest one");
    expect(messageOf(path([step("A", 1, -1, 2, 3)]))).toContain("must not be below 0");
    expect(messageOf(path([step("A", 1, 1, null, null)]))).toContain("has no delay");
    expect(messageOf(path([]))).toContain("The path has no step");
    expect(
      messageOf(
        path(
          rippleCarrySteps(0, { xor: step("X", 1, 1, 1, 1), and: step("A", 1, 1, 1, 1), or: step("O", 1, 1, 1, 1) })
            .carryOut,
        ),
      ),
    ).toContain("0 is no count");
  });
  test("a share outside its range", () => {
    expect(messageOf(path([step("A", 1, 1, 2, 3)], { unknownMinShare: 1.5 }))).toContain("unknownMinShare");
    expect(messageOf(path([step("A", 1, 1, 2, 3)], { unknownMaxShare: 0.5 }))).toContain("unknownMaxShare");
  });
});

test("a part of the list becomes a step with the figures of its family, and without them where there are none", () => {
  const [and, inverter] = [findPart("08"), findPart("05")];
  if (!and || !inverter) throw new Error("the parts are missing");
  expect(stepOfPart(and, "HC", 3)).toEqual(step("74HC08", 3, null, 7, 18));
  expect(stepOfPart(inverter, "HC", 1)).toEqual(step("74HC05", 1, null, null, null));
  expect(stepOfPart(and, "constructor", 1)).toMatchObject({ typicalS: null, maxS: null });
});
