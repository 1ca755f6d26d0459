import { describe, expect, test } from "vitest";
import { doubtfulAfter, type BoardMap, type Covers, type Rework, type Touched } from "@/lib/calc/doubt";
import { standing } from "../../support/standing-checks";

const rework = (touches: Partial<Touched>, more: Partial<Rework> = {}): Rework => ({
  unitId: "SUM-01",
  board: "SUM",
  kind: "bodge wire",
  touches: { signals: [], pins: [], parts: [], blocks: [], rails: [], ...touches },
  neighbours: [],
  ...more,
});

const MAP: BoardMap = {
  board: "SUM",
  pins: [
    { connector: "J1", pin: "a4", signal: "PH6" },
    { connector: "J1", pin: "a5", signal: "PWROK" },
    { connector: "U7", pin: "3", signal: "CARRY_N" },
  ],
  parts: [{ part: "U7", signals: ["LATCH"], blocks: ["adder"] }],
  aliases: [{ name: "PWR_OK", aliases: ["PWROK"] }],
};

/** Why one check that covers this is in doubt; undefined when it is not. */
function why(covers: Partial<Covers>, touches: Partial<Touched>): string[] | undefined {
  const check = standing({ id: "check", covers: { signals: [], pins: [], rails: [], blocks: [], ...covers } });
  const [line] = doubtfulAfter(rework(touches), [check], { maps: [MAP] }).lines;
  return line?.outcome === "doubtful" ? line.reasons.map(({ sentence }) => sentence) : undefined;
}

describe("A passed check is in doubt", () => {
  test.each<[Partial<Covers>, Partial<Touched>, string]>([
    [{ signals: ["PH6"] }, { signals: ["PH6"] }, "It covers PH6; the rework touches it."],
    [{ signals: ["PH[7:0]"] }, { signals: ["PH6"] }, "It covers PH6 of PH[7:0]; the rework touches it."],
    [{ signals: ["PH6"] }, { signals: ["PH[7:0]"] }, "It covers PH6; the rework touches it."],
    [{ signals: ["PH[7:0]"] }, { signals: ["PH[3:0]"] }, "It covers PH[7:0]; the rework touches 4 lines of it."],
    [{ rails: ["+5 V"] }, { rails: ["+5V"] }, "It covers +5 V; the rework touches it."],
    [{ rails: ["−12 V"] }, { signals: ["-12V"] }, "It covers −12 V; the rework touches it."],
    [{ signals: ["PH6"] }, { pins: ["J1 a4"] }, "It covers PH6; the rework touches J1 a4, which carries it."],
    [{ pins: ["J1 a4"] }, { signals: ["PH6"] }, "It covers J1 a4, which carries PH6; the rework touches PH6."],
    [{ pins: ["J1-A4"] }, { pins: ["a4"] }, "It covers J1-A4; the rework touches it."],
    [{ pins: ["J1 c9"] }, { pins: ["J1 c9"] }, "It covers J1 c9; the rework touches it."],
    [{ signals: ["LATCH"] }, { parts: ["u7"] }, "It covers LATCH; the rework touches u7, which it hangs on."],
    [{ signals: ["CARRY_N"] }, { parts: ["U7"] }, "It covers CARRY_N; the rework touches U7, which it hangs on."],
    [
      { blocks: ["Adder"] },
      { parts: ["U7"] },
      "It covers the block Adder; the rework touches U7, which is part of it.",
    ],
    [{ blocks: ["adder"] }, { blocks: ["adder"] }, "It covers the block adder; the rework touches it."],
    [{ pins: ["U7 4"] }, { parts: ["U7"] }, "It covers U7 4; the rework touches U7."],
    [{ pins: ["J1 a4"] }, { parts: ["J1"] }, "It covers J1 a4; the rework touches J1."],
    [{ signals: ["PWR_OK"] }, { pins: ["J1 a5"] }, "It covers PWR_OK; the rework touches PWROK, another name of it."],
  ])("that covers %j when %j is touched", (covers, touches, sentence) => {
    expect(why(covers, touches)).toEqual([sentence]);
  });

  test("once, where it names one signal by name and by pin", () => {
    expect(why({ signals: ["PH6"], pins: ["J1 a4"] }, { signals: ["PH6"] })).toEqual([
      "It covers PH6; the rework touches it.",
    ]);
  });
});

describe("A passed check is not in doubt", () => {
  test.each<[Partial<Covers>, Partial<Touched>]>([
    [{ signals: ["PH6"] }, { signals: ["PH60"] }],
    [{ rails: ["+12 V"] }, { rails: ["-12 V"] }],
    [{ pins: ["J1 a4"] }, { pins: ["J2 a4"] }],
    [{ pins: ["J1 a4"] }, { pins: ["J1 a40"] }],
    [{ blocks: ["adder"] }, { signals: ["adder"] }],
  ])("that covers %j when %j is touched", (covers, touches) => {
    expect(why(covers, touches)).toBeUndefined();
  });

  test("and the line says so", () => {
    const check = standing({ id: "check", covers: { signals: ["CLK"], pins: [], rails: [], blocks: [] } });
    expect(doubtfulAfter(rework({ signals: ["PH6"] }), [check]).lines).toEqual([
      { checkId: "check", outcome: "untouched", sentence: "Nothing that it covers or relies on is touched." },
    ]);
  });
});

describe("What was named and cannot be used", () => {
  test("is said, and the rest still counts", () => {
    const check = standing({ id: "check", covers: { signals: ["PH6"], pins: [], rails: [], blocks: [] } });
    const after = doubtfulAfter(rework({ signals: ["PH6"], pins: ["corner"], parts: ["U99"] }), [check], {
      maps: [MAP],
    });
    expect(after.doubtful).toEqual(["check"]);
    expect(after.remarks).toEqual([
      "“corner” is no pin; write it as “J1 a4”.",
      "What hangs on U99 is not known: name the signals and blocks that it belongs to.",
    ]);
  });
});
