import { describe, expect, it } from "vitest";
import { foresee } from "@/components/bench/foresee";
import { nextFree, nextHold } from "@/components/bench/next-check";
import type { CheckState } from "@/db/schema/travelers";
import type { BlockerView } from "@/lib/traveler/traveler-view";

const blockedBy = (checkId: string, state: CheckState = "untested"): BlockerView => ({
  checkId,
  state,
  serial: "SIN-01",
  title: checkId,
  why: "hold point",
});
const check = (id: string, state: CheckState, blockers: BlockerView[] = [], holdPoint = false) => ({
  id,
  state,
  blockers,
  holdPoint,
});
const states = (checks: { state: CheckState }[]) => checks.map(({ state }) => state);

describe("what the bench foresees while attempts are on their way", () => {
  it("shows a conforming attempt as passed and another as failed", () => {
    const seen = foresee(
      [check("a", "untested"), check("b", "doubtful")],
      [
        { checkId: "a", verdict: "guard-band" },
        { checkId: "b", verdict: "does-not-conform" },
      ],
    );
    expect(states(seen)).toEqual(["passed", "failed"]);
  });

  it("frees a check when everything it waits for will hold, so that one can go on without network", () => {
    const checks = [check("hold", "untested", [], true), check("next", "waiting", [blockedBy("hold")])];
    expect(states(foresee(checks, [{ checkId: "hold", verdict: "conforms" }]))).toEqual(["passed", "untested"]);
    expect(states(foresee(checks, [{ checkId: "hold", verdict: "does-not-conform" }]))).toEqual(["failed", "waiting"]);
  });

  it("keeps a check waiting for what lies on another unit", () => {
    const checks = [check("a", "untested"), check("b", "waiting", [blockedBy("a"), blockedBy("elsewhere")])];
    const [, b] = foresee(checks, [{ checkId: "a", verdict: "conforms" }]);
    expect(b?.state).toBe("waiting");
    expect(b?.blockers.map(({ checkId }) => checkId)).toEqual(["elsewhere"]);
  });

  it("lets the later of two attempts count", () => {
    const seen = foresee(
      [check("a", "untested")],
      [
        { checkId: "a", verdict: "does-not-conform" },
        { checkId: "a", verdict: "conforms" },
      ],
    );
    expect(states(seen)).toEqual(["passed"]);
  });
});

describe("the next check on the bench", () => {
  it("is the next free one, going round", () => {
    const checks = [check("a", "reopened"), check("b", "passed"), check("c", "waiting"), check("d", "untested")];
    expect(nextFree(checks, "b")?.id).toBe("d");
    expect(nextFree(checks, "d")?.id).toBe("a");
  });

  it("comes back to a failed one only when nothing fresh is left", () => {
    expect(nextFree([check("a", "failed"), check("b", "passed"), check("c", "untested")], "b")?.id).toBe("c");
    expect(nextFree([check("a", "failed"), check("b", "passed")], "b")?.id).toBe("a");
  });

  it("is none when all hold or wait", () => {
    expect(nextFree([check("a", "passed"), check("b", "waiting")], undefined)).toBeUndefined();
  });

  it("names the hold point ahead, the check itself included", () => {
    const checks = [check("a", "passed", [], true), check("b", "untested"), check("c", "untested", [], true)];
    expect(nextHold(checks, "a")?.id).toBe("c");
    expect(nextHold(checks, "c")?.id).toBe("c");
  });
});
