import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { parseLimits } from "@/lib/calc/units";
import { typePath } from "@/lib/delay-path/type-path";
import { typedPath } from "@/lib/delay-path/schema";
import { windowLimits } from "@/lib/delay-path/window-limits";
import { workOut } from "@/lib/delay-path/work-out";

const window = (lowerS: number | null, upperS: number | null) => ({ lowerS, upperS, expectedS: 1e-7, rule: "" });
const plain = (text: string | undefined) => text?.replaceAll("\u202f", " ");

describe("the window of a capture check", () => {
  it("is rounded outwards to three digits, and open where nothing is known", () => {
    expect(plain(windowLimits(window(54.75e-9, 503.2e-9)))).toBe("54 … 504 ns");
    expect(plain(windowLimits(window(null, 288e-9)))).toBe("≤ 288 ns");
    expect(plain(windowLimits(window(25e-9, null)))).toBe("≥ 25 ns");
    expect(windowLimits(window(null, null))).toBeUndefined();
  });

  it("reads back as limits that shut nothing out", () => {
    const seconds = fc.double({ min: 1e-10, max: 1e-3, noNaN: true });
    fc.assert(
      fc.property(seconds, seconds, (one, other) => {
        const [lower, upper] = [Math.min(one, other), Math.max(one, other)];
        const read = parseLimits(windowLimits(window(lower, upper)) ?? "", "s");
        expect(read.ok).toBe(true);
        if (!read.ok) return;
        expect(read.value.lower).toBeLessThanOrEqual(lower * (1 + 1e-12));
        expect(read.value.upper).toBeGreaterThanOrEqual(upper * (1 - 1e-12));
      }),
    );
  });
});

describe("a path", () => {
  const step = { part: "86", family: "HC", name: "", count: 2, minS: null, typicalS: null, maxS: 30e-9 };
  const conditions = { volts: 5, loadPf: 50 };
  const stored = {
    measure: "CLK to Q",
    steps: [step],
    unknownMinShare: 0.25,
    unknownMaxShare: null,
    derating: { family: "HC", typicalAt: { volts: 5, loadPf: 15 }, limitsAt: conditions, board: conditions },
    clock: { clockToOutputMaxS: 30e-9, setupS: 15e-9, skewS: 0, holdS: 3e-9, clockToOutputMinS: null },
  };

  it("is the same after it was shown in its form and read again", () => {
    expect(typedPath.parse(typePath(stored))).toEqual(stored);
  });

  it("takes a typed figure over the part’s, and the part’s where none is typed", () => {
    const worked = workOut({ ...stored, derating: null }, { own: [], families: [] });
    expect(worked).toMatchObject({ ok: true, given: [{ name: "74HC86", typicalS: 11e-9, maxS: 30e-9 }] });
  });

  it("of a family that is not in the table says so", () => {
    expect(workOut(stored, { own: [], families: [] })).toEqual({
      ok: false,
      field: "derating.family",
      message: "There is no family HC.",
    });
  });
});
