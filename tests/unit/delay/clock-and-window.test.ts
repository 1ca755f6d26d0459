import { describe, expect, test } from "vitest";
import { delayWindow, highestClock } from "@/lib/calc/delay";
import { delayOf, NS, path, step } from "./path";

describe("the window of a capture", () => {
  test("reaches from the lowest sum to the worst case", () => {
    const window = delayWindow(delayOf(path([step("A", 2, 3, 7, 18)])));
    expect(window).toMatchObject({ lowerS: 6e-9, expectedS: 14e-9, upperS: 36e-9 });
    expect(window.rule).not.toContain("assumed");
  });
  test("stays open where delays are not known, and names assumptions", () => {
    const open = delayWindow(delayOf(path([step("A", 2, null, 7, 18)])));
    expect(open.lowerS).toBeNull();
    expect(open.rule).toContain("open below");
    const assumed = delayWindow(delayOf(path([step("A", 2, null, 7, 18)], { unknownMinShare: 0.25 })));
    expect(assumed.lowerS).toBeCloseTo(3.5 * NS, 15);
    expect(assumed.rule).toContain("common practice, no source");
  });
});

describe("the highest clock", () => {
  const between = {
    path: delayOf(path([step("A", 2, 3, 7, 18)])),
    clockToOutputMaxS: 30 * NS,
    setupS: 12 * NS,
    skewS: 2 * NS,
  };

  test("is set by clock to output, path, set-up and skew at their worst", () => {
    const limit = highestClock({ ...between, hold: { clockToOutputMinS: 4 * NS, holdS: 3 * NS } });
    if (!limit.ok) throw new Error(limit.message);
    expect(limit.value.periodS).toBeCloseTo(80 * NS, 15);
    expect(limit.value.highestHz).toBeCloseTo(12.5e6, 3);
    expect(limit.value.holdSlackS).toBeCloseTo(5 * NS, 15);
    expect(limit.value.sentences[0]).toBe("The period must be at least 80\u202fns: a clock of 12.5\u202fMHz at most.");
  });

  test("tells of data that change too early", () => {
    const limit = highestClock({ ...between, skewS: 9 * NS, hold: { clockToOutputMinS: 1 * NS, holdS: 3 * NS } });
    if (!limit.ok) throw new Error(limit.message);
    expect(limit.value.sentences[1]).toBe("The data change 5\u202fns too early for the hold time.");
  });

  test("is not promised where a highest delay is missing, nor a hold time where a lowest is", () => {
    const open = delayOf(path([step("A", 2, null, 7, null)]));
    const limit = highestClock({ ...between, path: open, hold: { clockToOutputMinS: 1 * NS, holdS: 0 } });
    if (!limit.ok) throw new Error(limit.message);
    expect(limit.value).toMatchObject({ periodS: null, highestHz: null, holdSlackS: null });
    expect(limit.value.sentences).toHaveLength(2);
  });

  test.each([
    { setupS: -1 },
    { skewS: NaN },
    { clockToOutputMaxS: Infinity },
    { hold: { clockToOutputMinS: NaN, holdS: 0 } },
    { hold: { clockToOutputMinS: null, holdS: -1 } },
  ])("refuses %o", (wrong) => {
    expect(highestClock({ ...between, hold: null, ...wrong }).ok).toBe(false);
  });
});
