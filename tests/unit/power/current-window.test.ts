import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { currentWindows } from "@/lib/calc/power";
import { fixed, linear, powerOf } from "./board";

const windowOf = (worstA: number, atRest = 1) => currentWindows(powerOf({ items: [fixed(worstA, { atRest })] }))[0];

describe("the current window of a first power-on, common practice, no source", () => {
  test("reaches from half of what flows without a clock to the worst case", () => {
    expect(windowOf(0.2)).toMatchObject({ rail: "+5V", lowerA: 0.05, expectedA: 0.1, upperA: 0.2, limitA: 0.25 });
    expect(windowOf(0.2, 0)?.lowerA).toBe(0);
  });

  test.each([
    [0.001, 0.01],
    [0.03, 0.04],
    [0.08, 0.1],
    [0.1, 0.13],
    [0.5, 0.63],
    [2, 2.5],
    [2.01, 2.55],
  ])("a worst case of %s A sets the supply to %s A", (worst, limit) => expect(windowOf(worst)?.limitA).toBe(limit));

  test("holds only for rails that come from outside", () => {
    const power = powerOf({ items: [fixed(0.1, { rail: "+3.3V" }), linear("LDO", "+5V", "+3.3V", 3.3)] });
    expect(currentWindows(power).map((window) => window.rail)).toEqual(["+5V"]);
  });

  test("whatever the board, lower ≤ expected ≤ upper ≤ limit, and the limit is no more than one step above 1.25 × worst", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 20, noNaN: true }),
        fc.double({ min: 0, max: 1, noNaN: true }),
        (worst, rest) => {
          const window = windowOf(worst, rest);
          if (!window) throw new Error("no window");
          expect(window.lowerA).toBeLessThanOrEqual(window.expectedA);
          expect(window.expectedA).toBeLessThanOrEqual(window.upperA);
          expect(window.limitA).toBeGreaterThanOrEqual(window.upperA * 1.25 - 1e-9);
          expect(window.limitA).toBeLessThanOrEqual(window.upperA * 1.25 + 0.05 + 1e-9);
        },
      ),
    );
  });
});
