import { describe, expect, it } from "vitest";
import { NOTHING_HELD, withAnswer, without } from "@/components/probing/bench/held-results";

const said = (id: string, probe: number) => ({
  id,
  probe,
  beeps: true,
  typed: "",
  performedAt: "2026-12-01T18:00:00Z",
});

describe("Answers held on a device", () => {
  it("a correction of an answer that never left takes its place, with nothing to take back", () => {
    const first = withAnswer(NOTHING_HELD, said("a", 0), undefined);
    expect(withAnswer(first, said("b", 0), "a")).toEqual({ results: [said("b", 0)], voids: [] });
  });

  it("a correction of an answer that arrived voids it", () => {
    expect(withAnswer(NOTHING_HELD, said("b", 0), "a")).toEqual({ results: [said("b", 0)], voids: ["a"] });
  });

  it("what was said while a batch was on its way stays", () => {
    const sent = withAnswer(NOTHING_HELD, said("a", 0), "old");
    const now = withAnswer(sent, said("b", 1), undefined);
    expect(without(now, sent)).toEqual({ results: [said("b", 1)], voids: [] });
  });
});
