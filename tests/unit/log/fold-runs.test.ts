import { describe, expect, it } from "vitest";
import { foldRuns } from "@/lib/log-entry/fold-runs";

const at = (minutes: number) => new Date(Date.UTC(2026, 1, 3, 20, minutes));
const attached = { kind: "evidence.attached", actorId: "bram", checkId: "c1", unitSerial: "CON-01" };

describe("files attached in a row", () => {
  const lengths = (rows: Parameters<typeof foldRuns>[0]) => foldRuns(rows).map((run) => run.length);

  it("by one person to one check stand together", () => {
    expect(lengths([3, 2, 1].map((minute) => ({ ...attached, at: at(minute) })))).toEqual([3]);
  });

  it("by another person, to another check, after a while or with something between stand apart", () => {
    const first = { ...attached, at: at(40) };
    expect(lengths([first, { ...first, actorId: "mira" }])).toEqual([1, 1]);
    expect(lengths([first, { ...first, checkId: "c2" }])).toEqual([1, 1]);
    expect(lengths([first, { ...first, at: at(24) }])).toEqual([1, 1]);
    expect(lengths([first, { ...first, kind: "attempt.recorded" }, first])).toEqual([1, 1, 1]);
  });

  it("never folds anything else", () => {
    const attempt = { ...attached, kind: "attempt.recorded", at: at(1) };
    expect(lengths([attempt, attempt])).toEqual([1, 1]);
  });
});
