import { describe, expect, it } from "vitest";
import { compareVersions, type VersionCheck } from "@/lib/traveler/compare-versions";

const check = (key: string, position: number, given: Partial<VersionCheck> = {}): VersionCheck => ({
  key,
  position,
  stage: "power-on",
  title: key,
  instruction: "",
  caution: "",
  reference: "",
  holdPoint: false,
  kind: "statement",
  spec: { expects: "" },
  covers: { signals: [], pins: [], rails: [], blocks: [] },
  needs: [],
  ...given,
});

const kept = (before: Partial<VersionCheck>, after: Partial<VersionCheck>) => {
  const { kept: stays, changed } = compareVersions([check("a", 1, before)], [check("a", 1, after)]);
  return {
    stays: stays.length === 1 && changed.length === 0,
    edits: [...stays, ...changed].flatMap((one) => one.edits.map((edit) => edit.what)),
  };
};

describe("moving from one version to the next", () => {
  it("keeps attempts through new wording, a hold point more and other prerequisites, and lists them", () => {
    expect(kept({}, {})).toEqual({ stays: true, edits: [] });
    const after = { title: "A", instruction: "Slowly.", caution: "Hot.", reference: "Practice", holdPoint: true };
    expect(kept({}, after)).toEqual({
      stays: true,
      edits: ["title", "instruction", "caution", "reference", "hold point"],
    });
  });

  it.each([
    ["another stage", { stage: "function" as const }],
    ["another expectation", { spec: { expects: "no bridge" } }],
    ["another kind", { kind: "photo", spec: { expects: "", minimum: 1 } }],
    ["another coverage", { covers: { signals: ["CLK"], pins: [], rails: [], blocks: [] } }],
  ])("starts afresh with %s", (_what, after) => {
    expect(kept({}, after).stays).toBe(false);
  });

  it("does not mind the order of keys in what is stored, nor of what is covered", () => {
    const covers = (signals: string[]) => ({ signals, pins: [], rails: [], blocks: [] });
    expect(
      kept(
        { spec: { a: 1, expects: "x" }, covers: covers(["A", "B"]) },
        { spec: { expects: "x", a: 1 }, covers: covers(["B", "A"]) },
      ),
    ).toEqual({ stays: true, edits: [] });
  });

  it("names what is new and what goes, and a check that took another place, but not those that only moved along", () => {
    const before = [check("a", 1), check("b", 2), check("c", 3), check("d", 4)];
    const after = [check("new", 1), check("a", 2), check("d", 3), check("b", 4)];
    const found = compareVersions(before, after);
    expect(found.added.map((one) => one.key)).toEqual(["new"]);
    expect(found.dropped.map((one) => one.key)).toEqual(["c"]);
    expect(found.kept.map((one) => [one.key, one.edits])).toEqual([
      ["a", []],
      ["d", [{ what: "place", from: "after “b”", to: "after “a”" }]],
      ["b", [{ what: "place", from: "after “a”", to: "after “d”" }]],
    ]);
  });
});
