import { describe, expect, it } from "vitest";
import type { ContinuityReport, FindingKind } from "@/lib/calc/continuity";
import { readTyped } from "@/components/probing/bench/read-typed";
import { spokenPair } from "@/components/probing/bench/spoken-pair";
import { timeWords } from "@/components/probing/time-words";
import { isAsExpected } from "@/lib/probing/judge-result";
import { paceOf } from "@/lib/probing/own-pace";
import { provesUnit, sumUp } from "@/lib/probing/sum-up";

const limits = { joinedOhm: 10, apartOhm: 1e7 };
const report = (kinds: FindingKind[], left = 0): ContinuityReport => ({
  findings: kinds.map((kind) => ({
    kind,
    nets: [],
    pieces: [],
    pins: [],
    probes: [],
    sentence: "",
    lookAt: "",
    mendFirst: "",
  })),
  repeat: [],
  left: { continuity: left, isolation: 0, "follow-up": 0 },
  remarks: [],
});

describe("What a round says", () => {
  it("a beep is good for joined points, silence for separate ones; a figure is held against the limit, which is still good", () => {
    const judged = (expected: "joined" | "apart", beeps: boolean | null, ohm: number | null) =>
      isAsExpected({ expect: expected }, { beeps, ohm }, limits);
    expect([judged("joined", true, null), judged("joined", false, null)]).toEqual([true, false]);
    expect([judged("apart", true, null), judged("apart", false, null)]).toEqual([false, true]);
    expect([judged("joined", null, 10), judged("joined", null, 10.1)]).toEqual([true, false]);
    expect([judged("apart", null, 1e7), judged("apart", null, 9e6)]).toEqual([true, false]);
  });

  it("sums up the worst first and never proves a unit while a probe is left", () => {
    expect(sumUp(report(["open", "crossed", "open"], 14))).toBe("1 crossed pair, 2 opens, 14 probes left");
    expect(sumUp(report([]))).toBe("everything as the netlist says");
    expect(sumUp(report([], 1))).toBe("nothing found so far, 1 probe left");
    expect([provesUnit(report([])), provesUnit(report([], 1)), provesUnit(report(["leak"]))]).toEqual([
      true,
      false,
      false,
    ]);
  });

  it("one's own pace is the middle gap without the breaks, and is guessed until there are ten gaps", () => {
    const at = (seconds: number) => new Date(1_800_000_000_000 + seconds * 1000);
    const steady = Array.from({ length: 12 }, (_, index) => at(index * 5));
    expect(paceOf([...steady, at(4000), at(4005)])).toEqual({ secondsEach: 5, isOwn: true });
    expect(paceOf(steady.slice(0, 5)).isOwn).toBe(false);
    expect([timeWords(20), timeWords(1500), timeWords(6000), timeWords(7200)]).toEqual([
      "under a minute",
      "about 25 min",
      "about 1 h 40 min",
      "about 2 h",
    ]);
  });

  it("an overload of the meter is silence, and a negative resistance is none", () => {
    expect(readTyped("OL")).toEqual({ ok: true, beeps: false, ohm: null });
    expect(readTyped("0R3")).toEqual({ ok: true, beeps: null, ohm: 0.3 });
    expect(readTyped("-3").ok).toBe(false);
  });

  it("is read aloud with both points, letters apart from figures", () => {
    const point = (name: string) => ({ name, net: "A", xMm: null, yMm: null });
    const probe = { a: 0, b: 1, expect: "joined", kind: "continuity" } as const;
    expect(spokenPair(probe, point("U12-3"), point("J1-a4"))).toBe("U 12 pin 3, and J 1 pin a 4. should beep");
  });
});
