import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { CheckHistory } from "@/lib/check/check-history";
import { deriveStates } from "@/lib/check/derive-states";
import { nextChecks } from "@/lib/check/next-checks";
import { history, machines } from "./histories";

const bad = (arrival: number) => ({ id: `bad-${arrival}`, arrival, verdict: "does-not-conform" as const });

const rank = (machine: CheckHistory[]) => {
  const derived = deriveStates(machine);
  return nextChecks(machine.map((check) => ({ ...check, state: derived.get(check.id)?.state ?? "untested" })));
};

describe("what the bench should do next", () => {
  it("comes in the order of how many checks wait for it, through other units too", () => {
    const machine = [
      history({ id: "look", position: 1 }),
      history({ id: "rail", position: 2, holdPoint: true }),
      history({ id: "ripple", position: 3 }),
      history({ id: "clock", unitId: "tim", serial: "TIM-01", position: 1, needs: ["ripple"] }),
    ];
    expect(rank(machine).map(({ checkId, holdsBack, reason }) => ({ checkId, holdsBack, reason }))).toEqual([
      { checkId: "rail", holdsBack: 2, reason: "Holds back 2 checks." },
      { checkId: "look", holdsBack: 0, reason: "Free to do. Nothing waits for it." },
    ]);
  });

  it("puts a failing check before an untested one that holds back as much", () => {
    const machine = [
      history({ id: "a", position: 1 }),
      history({ id: "b", position: 2, last: bad(1), failedArrival: 1 }),
    ];
    expect(rank(machine).map((next) => next.checkId)).toEqual(["b", "a"]);
  });

  it("says “1 check” of one", () => {
    const machine = [history({ id: "a", position: 1, holdPoint: true }), history({ id: "b", position: 2 })];
    expect(rank(machine)[0]?.reason).toBe("Holds back 1 check.");
  });

  it("never offers a check that is blocked or holds, and offers something while anything waits", () => {
    fc.assert(
      fc.property(machines, (machine) => {
        const derived = deriveStates(machine);
        const next = rank(machine);
        for (const one of next) {
          expect(derived.get(one.checkId)?.blockers).toEqual([]);
          expect(["failed", "reopened", "doubtful", "untested"]).toContain(one.state);
        }
        const waiting = [...derived.values()].filter((one) => one.state === "waiting");
        if (waiting.length > 0) expect(next[0]?.holdsBack).toBeGreaterThan(0);
        const open = [...derived.values()].filter(({ state }) => state !== "passed" && state !== "conceded");
        expect(Math.max(0, ...next.map((one) => one.holdsBack))).toBeLessThan(Math.max(1, open.length));
      }),
    );
  });
});
