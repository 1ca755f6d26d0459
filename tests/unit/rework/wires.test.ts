import { describe, expect, it } from "vitest";
import { doubtSentence } from "@/components/traveler/doubt-sentence";
import { wiresOf } from "@/components/rework/WireTable";
import type { ReworkView } from "@/lib/rework/rework-view";
import { nameRework, nextWire } from "@/lib/rework/rework-words";

const rework = (number: number, wire: string, given: Partial<ReworkView["wire"] & object> = {}): ReworkView => ({
  ...{ id: `r${number}`, number, kind: "bodge-wire", what: "", why: "", touches: [], fault: null, carriedFrom: null },
  ...{ doubts: [], spared: [], before: [], after: [], performedAt: "", by: { id: null, name: "Bram" } },
  wire: { number: wire, from: "U6-12", to: "U9-3", colour: "white", out: false, ...given },
});

describe("the list of wires", () => {
  it("has each wire once, as the newest rework says, by number", () => {
    const list = wiresOf([rework(4, "W2", { to: "U9-4" }), rework(3, "W10"), rework(2, "w2"), rework(1, "W1")]);
    expect(list.map(({ wire }) => `${wire.number} ${wire.to}`)).toEqual(["W1 U9-3", "W2 U9-4", "W10 U9-3"]);
  });

  it("leaves out a wire that was taken out again, and has it when it is put back", () => {
    const [put, taken, again] = [rework(1, "W1"), rework(2, "W1", { out: true }), rework(3, "W1")];
    expect(wiresOf([taken, put])).toEqual([]);
    expect(wiresOf([again, taken, put]).map(({ number }) => number)).toEqual([3]);
  });

  it("goes on with the next free number", () => {
    expect(nextWire([])).toBe("W1");
    expect(nextWire(["W2", "w11", "blue one"])).toBe("W12");
  });
});

describe("a rework is called", () => {
  it("by its wire, or by its number", () => {
    expect(nameRework({ kind: "bodge-wire", number: 4, wire: { number: "W3", out: false } })).toBe("Bodge wire W3");
    expect(nameRework({ kind: "bodge-wire", number: 5, wire: { number: "W3", out: true } })).toBe("Wire W3 taken out");
    expect(nameRework({ kind: "reflow", number: 6, wire: null })).toBe("Reflow, R6");
  });
});

describe("the sentence on a unit's page", () => {
  const doubt = (id: string, at: string, isSpared = false) => ({
    ...{ id, at, isSpared, rework: `Bodge wire ${id}`, serial: "CON-01", number: 1, reason: "" },
    by: { id: null, name: "Bram" },
  });
  const on = (state: "doubtful" | "passed", ...doubts: ReturnType<typeof doubt>[]) => ({ state, doubts });

  it("names the newest rework that checks still wait for, and how many", () => {
    const [w1, w3] = [doubt("W1", "2026-02-03T19:00:00Z"), doubt("W3", "2026-02-04T19:00:00Z")];
    expect(doubtSentence([on("doubtful", w3, w1), on("doubtful", w3), on("doubtful", w1)], "UTC")).toBe(
      "Bodge wire W3 on Wed 4 Feb 2026 put 2 in doubt.",
    );
  });

  it("says nothing when all is repeated, or when only another failure casts doubt", () => {
    const spared = doubt("W3", "2026-02-04T19:00:00Z", true);
    expect(doubtSentence([on("passed", doubt("W1", "2026-02-03T19:00:00Z")), on("doubtful", spared)], "UTC")).toBe("");
  });
});
