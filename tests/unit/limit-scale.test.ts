import { describe, expect, it } from "vitest";
import { limitScale, standing } from "@/components/ui/glyphs/limit-scale";
import { stripWords } from "@/components/ui/glyphs/StageStrip";
import { initials } from "@/components/ui/Avatar";
import { writeDate } from "@/components/ui/DateTime";
import { moved } from "@/components/ui/ReorderList";

describe("the scale beside a reading", () => {
  it("shows both limits with the same room outside them", () => {
    const scale = limitScale({ lower: 4.75, upper: 5.25 });
    expect(scale.at(5)).toBeCloseTo(0.5);
    expect(scale.at(4.75)).toBeCloseTo(1 - scale.at(5.25));
    expect(scale.isOff(4)).toBe("below");
    expect(scale.isOff(6)).toBe("above");
    expect(scale.isOff(5.3)).toBeNull();
  });

  it("runs from zero to an upper limit alone, and from a lower limit alone to twice it", () => {
    expect(limitScale({ upper: 0.5 }).low).toBe(0);
    expect(limitScale({ lower: 1e6 }).high).toBe(2e6);
    expect(limitScale({ upper: -3 }).at(-6)).toBe(0);
  });

  it("bears limits that are the same, zero or missing", () => {
    for (const limits of [{ lower: 0, upper: 0 }, { lower: 3, upper: 3 }, { upper: 0 }, { lower: 0 }, {}]) {
      expect(Number.isFinite(limitScale(limits).at(0))).toBe(true);
    }
  });

  it.each([
    [4.749, "outside"],
    [4.75, "guard"],
    [4.78, "inside"],
    [5.22, "inside"],
    [5.23, "guard"],
    [5.251, "outside"],
  ])("places %d V at 4.75 … 5.25 V with a guard band of 0.03 V %s", (value, where) => {
    expect(standing(value, { lower: 4.75, upper: 5.25 }, 0.03)).toBe(where);
  });
});

describe("what a drawing says aloud", () => {
  it("counts what holds, with concessions, and names the rest", () => {
    const states = ["passed", "conceded", "doubtful", "doubtful", "failed"] as const;
    expect(stripWords({ name: "Continuity", states })).toBe("Continuity: 2 of 5 hold, 2 doubtful, 1 failed");
  });
});

describe("small things that show on every page", () => {
  it("writes a date that cannot be misread, in the reader's zone", () => {
    expect(writeDate("2026-02-03T18:40:00Z", "Europe/Berlin")).toBe("Tue 3 Feb 2026, 19:40");
    expect(writeDate("2026-02-03T18:40:00Z", "America/New_York", "short")).toBe("Tue 3 Feb, 13:40");
    expect(writeDate("yesterday", "UTC")).toBe("unknown");
  });

  it("takes initials from names of one word, of many and of none", () => {
    expect(["Marit Olsen", "ada", "Jean-Luc de la Tour", "élodie", "  "].map(initials)).toEqual([
      "MO",
      "A",
      "JT",
      "É",
      "?",
    ]);
  });

  it("lays moved rows down before or after the one they were dropped on", () => {
    expect(moved(["a", "b", "c", "d"], new Set(["a"]), "c", "after")).toEqual(["b", "c", "a", "d"]);
    expect(moved(["a", "b", "c", "d"], new Set(["c", "d"]), "a", "before")).toEqual(["c", "d", "a", "b"]);
    expect(moved(["a", "b"], new Set(["a"]), "a", "before")).toEqual(["a", "b"]);
  });
});
