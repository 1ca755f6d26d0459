import { describe, expect, test } from "vitest";
import { doubtfulAfter, type Rework, type Touched } from "@/lib/calc/doubt";
import { standing } from "../../support/standing-checks";

const rework = (touches: Partial<Touched>): Rework => ({
  unitId: "SUM-01",
  board: "SUM",
  kind: "bodge wire",
  touches: { signals: [], pins: [], parts: [], blocks: [], rails: [], ...touches },
  neighbours: [],
});
const signals = (...names: string[]) => ({ signals: names, pins: [], rails: [], blocks: [] });

describe("The builder's own choices", () => {
  const checks = [
    standing({ id: "rail", title: "Rail", covers: signals("+5V"), position: 1 }),
    standing({ id: "clock", title: "Clock", covers: signals("CLK"), position: 2 }),
    standing({ id: "relies", title: "Relies", covers: signals("X"), needs: ["clock"], position: 3 }),
  ];
  const touches = rework({ rails: ["+5V"] });

  test("add a check, and what relies on it comes along", () => {
    const choices = { added: [{ checkId: "clock", reason: "The wire runs past it." }], spared: [] };
    const after = doubtfulAfter(touches, checks, { choices });
    expect(after.doubtful).toEqual(["rail", "clock", "relies"]);
    expect(after.lines.slice(1)).toMatchObject([
      { reasons: [{ why: "added", sentence: "The wire runs past it." }] },
      { reasons: [{ sentence: "It relies on “Clock”, which is in doubt by your own choice." }] },
    ]);
  });

  test("spare a check with a reason, and without one it stays in doubt", () => {
    const spare = (reason: string) =>
      doubtfulAfter(touches, checks, { choices: { added: [], spared: [{ checkId: "rail", reason }] } });
    expect(spare("Measured while soldering.").doubtful).toEqual([]);
    expect(spare("Measured while soldering.").lines[0]).toMatchObject({
      outcome: "spared",
      reason: "Measured while soldering.",
      reasons: [{ sentence: "It covers +5V; the rework touches it." }],
    });
    expect(spare(" ").doubtful).toEqual(["rail"]);
    expect(spare(" ").remarks).toEqual(["Say why “Rail” of SUM-01 is spared."]);
  });
});

describe("The repeat work", () => {
  const checks = [
    standing({ id: "a", stage: "continuity", position: 1 }),
    standing({ id: "b", stage: "continuity", position: 2 }),
    standing({ id: "c", stage: "function", position: 3 }),
    standing({ id: "d", stage: "function", position: 4, state: "untested" }),
  ];
  const paces = { inspection: null, continuity: 90, "power-on": null, function: 600, integration: null };

  test("is each stage's pace times its doubtful checks", () => {
    const { repeat } = doubtfulAfter(rework({}), checks, { paces });
    expect(repeat).toMatchObject({ checks: 3, seconds: 780, withoutPace: 0 });
    expect(repeat.sentence).toBe("3 checks to repeat, about 13\u202fmin.");
  });

  test("says what it cannot estimate", () => {
    const { repeat } = doubtfulAfter(rework({}), checks, { paces: { ...paces, function: null } });
    expect(repeat.sentence).toBe("3 checks to repeat, about 3\u202fmin, and 1 of a stage whose pace is not known.");
    expect(doubtfulAfter(rework({}), checks).repeat.sentence).toBe("3 checks to repeat; no pace is known yet.");
    expect(doubtfulAfter(rework({}), []).repeat.sentence).toBe("Nothing is to be repeated.");
  });
});
