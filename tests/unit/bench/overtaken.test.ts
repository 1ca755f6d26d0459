import { describe, expect, it } from "vitest";
import { arrivalIn, overtakenBy, overtakenSince } from "@/components/bench/overtaken-by";

const attempt = (arrival: number, id: string, voided = false) => ({
  arrival,
  by: { id, name: id === "me" ? "Bram" : "Mira" },
  summary: "4.98 V",
  voided: voided ? { by: { id, name: "Mira" }, at: "2026-01-01T00:00:00Z", reason: "slip" } : null,
});
const check = (attempts: ReturnType<typeof attempt>[]) => [{ id: "c", title: "Rail", attempts }];
const own = [{ checkId: "c", arrival: 7, at: 0 }];

describe("Two builders at the same check", () => {
  it("tells the later one what the server says came before", () => {
    expect(overtakenBy({ overtook: { by: "Mira", summary: "4.98 V" } })).toContain(
      "Mira recorded this check just before",
    );
    expect(overtakenBy({ overtook: null })).toBeUndefined();
  });

  it("tells the earlier one of an attempt that stands above the own", () => {
    const said = overtakenSince(check([attempt(9, "you"), attempt(7, "me")]), own, "me");
    expect(said).toBe(
      "Rail: Mira recorded this check just after you: 4.98 V. Both are kept; theirs came later and counts.",
    );
  });

  it("says nothing of one's own later attempt, of an earlier one, or of a voided one", () => {
    expect(overtakenSince(check([attempt(9, "me"), attempt(7, "me")]), own, "me")).toBeUndefined();
    expect(overtakenSince(check([attempt(7, "me"), attempt(5, "you")]), own, "me")).toBeUndefined();
    expect(overtakenSince(check([attempt(9, "you", true), attempt(7, "me")]), own, "me")).toBeUndefined();
    expect(overtakenSince(check([attempt(9, "you")]), [], "me")).toBeUndefined();
  });

  it("reads the server's number out of its answer, and nothing out of another answer", () => {
    expect(arrivalIn({ arrival: 12 })).toBe(12);
    expect([arrivalIn(null), arrivalIn({ arrival: "12" }), arrivalIn("12")]).toEqual([undefined, undefined, undefined]);
  });
});
