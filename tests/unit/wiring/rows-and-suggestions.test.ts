import { describe, expect, test } from "vitest";
import { applyChanges, type KeptMap } from "@/components/wiring/draft/pin-drafts";
import { rowCache, rowsOf } from "@/components/wiring/editor/row-views";
import { suggestFor } from "@/components/wiring/grid/suggest";
import { EMPTY_TEXTS } from "@/lib/pin-map/pin-columns";
import { nextReference } from "@/lib/pin-map/next-reference";
import { face } from "./machine";

const known = { families: ["HC", "HCT", "LS"], rails: [] };
const header = { id: "j1", name: "CON J1", face: face("header-2x5") };
const kept: KeptMap = { j1: { version: 1, rows: { "3": { ...EMPTY_TEXTS, signal: "CLK" } } } };

describe("the rows of a table", () => {
  test("are all pins of the face in its order, with what is kept and what was typed", () => {
    const drafts = applyChanges({}, kept, [{ connectorId: "j1", pin: "4", column: "role", before: "", after: "zzz" }]);
    const rows = rowsOf(header, kept, drafts.j1, known);
    expect(rows.map(({ pin }) => pin)).toEqual(["1", "2", "3", "4", "5", "6", "7", "8", "9", "10"]);
    expect(rows[2]).toMatchObject({ texts: { signal: "CLK" }, isChanged: false, problems: {} });
    expect(rows[3]).toMatchObject({
      isChanged: true,
      problems: { role: expect.stringContaining("“zzz” is no role.") },
    });
  });

  test("hold pins that the face lost at their end, until they are emptied", () => {
    const lost: KeptMap = { j1: { version: 1, rows: { a9: { ...EMPTY_TEXTS, signal: "CLK" } } } };
    expect(rowsOf(header, lost, undefined, known).at(-1)).toMatchObject({
      pin: "a9",
      problems: { pin: "CON J1 has no pin a9. Move what it carries, or empty the row." },
    });
    const emptied = applyChanges({}, lost, [
      { connectorId: "j1", pin: "a9", column: "signal", before: "CLK", after: "" },
    ]);
    expect(rowsOf(header, lost, emptied.j1, known).at(-1)?.problems).toEqual({});
  });

  test("are made anew only where something changed", () => {
    const read = rowCache();
    const first = read(header, kept, undefined, known);
    expect(read(header, kept, undefined, known)).toBe(first);
    expect(read(header, { ...kept, other: { version: 1, rows: {} } }, undefined, known)).toBe(first);
    const drafts = applyChanges({}, kept, [{ connectorId: "j1", pin: "1", column: "signal", before: "", after: "X" }]);
    expect(read(header, kept, drafts.j1, known)).not.toBe(first);
  });
});

describe("suggestions", () => {
  const words = { signals: ["CLK", "CLK_N", "PH1", "PH10", "SUM_CLK"], families: known.families, groups: ["SUM_SEL"] };
  test.each([
    ["role", "pp", ["push-pull output"]],
    ["role", "ou", ["push-pull output", "three-state output", "open-drain output"]],
    ["role", "o", ["push-pull output", "open-drain output", "three-state output"]],
    ["family", "hc", ["HC", "HCT"]],
    ["family", "", ["HC", "HCT", "LS"]],
    ["signal", "cl", ["CLK", "CLK_N", "SUM_CLK"]],
    ["signal", "CLK", ["CLK_N", "SUM_CLK"]],
    ["signal", "", []],
    ["signal", "(", []],
    ["enableGroup", "s", ["SUM_SEL"]],
    ["loads", "1", []],
  ] as const)("for %s and %j are the likeliest first", (column, typed, suggested) => {
    expect(suggestFor(column, typed, words)).toEqual(suggested);
  });
});

describe("the reference of a connector that a copy makes", () => {
  test.each([
    ["X1", 4, ["X1"], "X4"],
    ["X1", 2, ["X1", "x2", "X3"], "X4"],
    ["J", 3, [], "J3"],
    ["7", 2, [], "J2"],
  ])("like %s for slot %i beside %j is %s", (like, slot, taken, reference) => {
    expect(nextReference(like, slot, taken)).toBe(reference);
  });
});
