import { describe, expect, it } from "vitest";
import { compareReworks, type ComparedRework } from "@/lib/rework/compare-reworks";

const rework = (id: string, given: Partial<ComparedRework> = {}): ComparedRework => ({
  ...{ id, number: Number(id.slice(1)), kind: "cut-track", what: "", wire: null, carriedFrom: null, touches: [] },
  ...given,
});
const wire = (from: string, to: string, out = false) => ({ number: "W1", from, to, colour: "", out });
const ids = (here: ComparedRework[], there: ComparedRework[]) =>
  compareReworks(here, there).map((pair) => [pair.here?.id, pair.there?.id]);

describe("two units of one revision", () => {
  it("have a rework in common that was carried over, in either direction", () => {
    expect(ids([rework("a1")], [rework("b1", { carriedFrom: "a1" })])).toEqual([["a1", "b1"]]);
    expect(ids([rework("a1", { carriedFrom: "b1" })], [rework("b1", { touches: ["pin U6-1"] })])).toEqual([
      ["a1", "b1"],
    ]);
  });

  it("have in common what both took from a third", () => {
    const [here, there] = [rework("a1", { carriedFrom: "c1" }), rework("b2", { carriedFrom: "c1", touches: ["x"] })];
    expect(ids([here], [there])).toEqual([["a1", "b2"]]);
  });

  it("have the same wire when its ends are the same, whichever is called the first", () => {
    const here = rework("a1", { kind: "bodge-wire", wire: wire("U6-12", "U9 3") });
    const there = rework("b4", { kind: "bodge-wire", wire: wire("u9-3", "U6.12") });
    expect(ids([here], [there])).toEqual([["a1", "b4"]]);
  });

  it("do not have in common a wire put in and one taken out", () => {
    const here = rework("a1", { kind: "bodge-wire", wire: wire("U6-12", "U9-3") });
    const there = rework("b1", { kind: "bodge-wire", wire: wire("U6-12", "U9-3", true) });
    expect(ids([here], [there])).toEqual([
      ["a1", undefined],
      [undefined, "b1"],
    ]);
  });

  it("pair each rework once and name what only one of them has, by number", () => {
    const cut = { touches: ["signal PH7"] };
    expect(
      ids([rework("a3"), rework("a2", cut), rework("a1", cut)], [rework("b5", cut), rework("b4", { kind: "reflow" })]),
    ).toEqual([
      ["a2", "b5"],
      ["a1", undefined],
      ["a3", undefined],
      [undefined, "b4"],
    ]);
  });
});
