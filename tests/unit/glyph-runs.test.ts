import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { glyphRuns } from "@/components/ui/glyphs/glyph-runs";
import { GLYPH_STATES } from "@/components/ui/glyphs/StateGlyph";

const states = fc.array(fc.constantFrom(...GLYPH_STATES), { maxLength: 80 });

describe("runs of glyphs", () => {
  it("show every check once, in order", () => {
    fc.assert(
      fc.property(states, fc.nat(80), (given, marked) => {
        const shown = glyphRuns(given, marked).flatMap((run) => Array.from({ length: run.count }, () => run.state));
        expect(shown).toEqual(given);
      }),
    );
  });

  it("leave the marked check alone in its frame", () => {
    expect(glyphRuns(["passed", "passed", "passed"], 1)).toEqual([
      { start: 0, state: "passed", count: 1, isMarked: false },
      { start: 1, state: "passed", count: 1, isMarked: true },
      { start: 2, state: "passed", count: 1, isMarked: false },
    ]);
  });

  it("break after six, so that a narrow strip can wrap", () => {
    expect(glyphRuns(Array.from({ length: 14 }, () => "waiting" as const)).map((run) => run.count)).toEqual([6, 6, 2]);
  });
});
