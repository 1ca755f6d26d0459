import { describe, expect, test } from "vitest";
import { CHECK_STAGES } from "@/lib/calc/check-graph";
import { doubtfulAfter, REWORK_KINDS, type Rework, type Touched } from "@/lib/calc/doubt";
import { standing } from "../../support/standing-checks";

const rework = (touches: Partial<Touched>, more: Partial<Rework> = {}): Rework => ({
  unitId: "SUM-01",
  board: "SUM",
  kind: "bodge wire",
  touches: { signals: [], pins: [], parts: [], blocks: [], rails: [], ...touches },
  neighbours: [],
  ...more,
});
const signals = (...names: string[]) => ({ signals: names, pins: [], rails: [], blocks: [] });

describe("A check that states nothing counts for the whole board", () => {
  const checks = CHECK_STAGES.map((stage, position) => standing({ id: stage, stage, position }));

  test.each(REWORK_KINDS.filter((kind) => kind !== "firmware"))("after a %s at every stage", (kind) => {
    expect(doubtfulAfter(rework({}, { kind }), checks).doubtful).toEqual([...CHECK_STAGES]);
  });

  test("after a change of firmware only where the board works", () => {
    const after = doubtfulAfter(rework({}, { kind: "firmware" }), checks);
    expect(after.doubtful).toEqual(["function", "integration"]);
    expect(after.lines[0]).toMatchObject({
      sentence: "It does not say what it covers, and firmware moves neither joints nor copper nor current.",
    });
  });

  test("but not for another unit of the same board", () => {
    const other = standing({ id: "other", serial: "SUM-02" });
    expect(doubtfulAfter(rework({ signals: ["PH6"] }), [other]).doubtful).toEqual([]);
  });
});

describe("A swapped part", () => {
  test("puts the board's currents and rails in doubt, whatever they name, and no other unit's", () => {
    const current = standing({ id: "first power", stage: "power-on", covers: signals("IMON") });
    const other = standing({ id: "other", serial: "SUM-02", stage: "power-on", covers: signals("IMON") });
    const after = doubtfulAfter(rework({ parts: ["U7"] }, { kind: "part swap" }), [current, other]);
    expect(after.doubtful).toEqual(["first power"]);
    expect(after.lines[0]).toMatchObject({
      reasons: [{ why: "implied", sentence: "A part is swapped, and SUM-01 may draw another current." }],
    });
  });
});

describe("A check that relies on a touched one is in doubt", () => {
  test("by a prerequisite on another unit, by a hold point, and through others, with the way", () => {
    const checks = [
      standing({ id: "rail", title: "+5 V", holdPoint: true, position: 1, covers: signals("+5V") }),
      standing({ id: "clock", title: "Clock", position: 2, covers: signals("CLK") }),
      standing({ id: "far", title: "Far", serial: "TIM-01", needs: ["clock"], covers: signals("STB") }),
      standing({ id: "free", title: "Free", serial: "TIM-01", covers: signals("STB") }),
    ];
    const after = doubtfulAfter(rework({ rails: ["+5 V"] }), checks);
    expect(after.doubtful).toEqual(["rail", "clock", "far"]);
    expect(after.lines.slice(1)).toMatchObject([
      { reasons: [{ sentence: "It relies on the hold point “+5 V”, which the rework touches." }] },
      {
        reasons: [
          {
            sentence: "It relies on “Clock” of SUM-01, and that on “+5 V” of SUM-01, which the rework touches.",
            through: ["clock", "rail"],
          },
        ],
      },
      { outcome: "untouched", sentence: "It is of another unit and relies on nothing that is touched." },
    ]);
  });

  test("not by a hold that was lifted", () => {
    const rail = standing({ id: "rail", holdPoint: true, lifted: true, position: 1, covers: signals("+5V") });
    const clock = standing({ id: "clock", position: 2, covers: signals("CLK") });
    expect(doubtfulAfter(rework({ rails: ["+5V"] }), [rail, clock]).doubtful).toEqual(["rail"]);
  });

  test("through checks that have no pass of their own, which keep their state and say so", () => {
    const checks = [
      standing({ id: "failed", state: "failed", covers: signals("CLK") }),
      standing({ id: "conceded", state: "conceded", needs: ["failed"], covers: signals("X") }),
      standing({ id: "passed", needs: ["conceded"], covers: signals("Y") }),
    ];
    const after = doubtfulAfter(rework({ signals: ["CLK"] }), checks);
    expect(after.doubtful).toEqual(["passed"]);
    const open = Object.fromEntries(after.lines.map((line) => [line.checkId, line]));
    expect(open["failed"]).toMatchObject({
      outcome: "open",
      sentence: "It fails as it is; it will be repeated anyway.",
    });
    expect(open["conceded"]).toMatchObject({ outcome: "open" });
  });
});

describe("Neighbours in the rack", () => {
  const covers = signals("PHI1");
  const checks = [
    standing({ id: "together", serial: "TIM-01", stage: "integration", covers }),
    standing({ id: "alone", serial: "TIM-01", stage: "function", covers }),
    standing({ id: "same pin", serial: "TIM-01", stage: "integration", covers: { ...signals(), pins: ["J1 a4"] } }),
  ];

  test("have their integration checks of a touched signal in doubt, since these prove both boards", () => {
    const touches = { signals: ["PHI1"], pins: ["J1 a4"] };
    expect(doubtfulAfter(rework(touches, { neighbours: ["TIM-01"] }), checks).doubtful).toEqual(["together"]);
    expect(doubtfulAfter(rework(touches), checks).doubtful).toEqual([]);
  });

  test("find it through their own pin map", () => {
    const maps = [{ board: "TIM", pins: [{ connector: "J1", pin: "a4", signal: "PHI1" }], parts: [], aliases: [] }];
    const found = doubtfulAfter(rework({ signals: ["PHI1"] }, { neighbours: ["TIM-01"] }), checks, { maps });
    expect(found.doubtful.sort()).toEqual(["same pin", "together"]);
  });
});
