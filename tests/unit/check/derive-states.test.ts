import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { holds, type CheckHistory } from "@/lib/check/check-history";
import { deriveStates } from "@/lib/check/derive-states";
import { history, machines } from "./histories";

const good = (arrival: number) => ({ id: `good-${arrival}`, arrival, verdict: "conforms" as const });
const bad = (arrival: number) => ({ id: `bad-${arrival}`, arrival, verdict: "does-not-conform" as const });
const stateOf = (histories: CheckHistory[], id: string) => deriveStates(histories).get(id);

describe("a check without a valid attempt", () => {
  it("is untested when nothing stands before it", () => {
    expect(stateOf([history({ id: "a" })], "a")).toMatchObject({ state: "untested", reason: "", blockers: [] });
  });

  it("waits behind an open hold point of its unit, in whatever stage, and says so", () => {
    const unit = [history({ id: "Rails to ground", holdPoint: true, position: 1 }), history({ id: "b", position: 2 })];
    expect(stateOf(unit, "b")).toMatchObject({
      state: "waiting",
      reason: "Waits for the hold point “Rails to ground”.",
    });
  });

  it("does not wait for a hold point that comes after it or stands on another unit", () => {
    const machine = [
      history({ id: "a", position: 1 }),
      history({ id: "h", position: 2, holdPoint: true }),
      history({ id: "other", unitId: "tim", serial: "TIM-01", position: 3 }),
    ];
    expect(stateOf(machine, "a")?.state).toBe("untested");
    expect(stateOf(machine, "other")?.state).toBe("untested");
  });

  it("is free when the hold point has passed, is conceded or was lifted for this unit", () => {
    const before = (given: Partial<CheckHistory>) =>
      stateOf([history({ id: "h", holdPoint: true, position: 1, ...given }), history({ id: "b", position: 2 })], "b")
        ?.state;
    expect(before({ last: good(1) })).toBe("untested");
    expect(before({ last: bad(1), failedArrival: 1, concessions: [{ attemptId: "bad-1", reason: "fine" }] })).toBe(
      "untested",
    );
    expect(before({ lifted: true })).toBe("untested");
    expect(before({ last: bad(1), failedArrival: 1 })).toBe("waiting");
  });

  it("waits for a prerequisite on another unit and names that unit", () => {
    const machine = [
      history({ id: "+5 V loaded" }),
      history({ id: "clock", unitId: "tim", serial: "TIM-01", needs: ["+5 V loaded"] }),
    ];
    expect(stateOf(machine, "clock")).toMatchObject({ state: "waiting", reason: "Waits for “+5 V loaded” of PSU-01." });
  });

  it("counts what it waits for besides the first, each once", () => {
    const unit = [
      history({ id: "h1", holdPoint: true, position: 1 }),
      history({ id: "h2", holdPoint: true, position: 2, needs: ["h1"] }),
      history({ id: "c", position: 3, needs: ["h1"] }),
    ];
    expect(stateOf(unit, "c")).toMatchObject({ reason: "Waits for the hold point “h1” and 1 more." });
    expect(stateOf(unit, "c")?.blockers.map((one) => [one.checkId, one.state])).toEqual([
      ["h1", "untested"],
      ["h2", "waiting"],
    ]);
  });
});

describe("a check with attempts", () => {
  it("goes by its last valid attempt", () => {
    expect(stateOf([history({ id: "a", last: good(2), failedArrival: 1 })], "a")?.state).toBe("passed");
    expect(stateOf([history({ id: "a", last: bad(2), failedArrival: 2 })], "a")?.state).toBe("failed");
  });

  it("passes inside the guard band, and remembers it", () => {
    const found = stateOf([history({ id: "a", last: { id: "x", arrival: 1, verdict: "guard-band" } })], "a");
    expect(found).toMatchObject({ state: "passed", insideGuardBand: true });
    expect(found?.reason).toContain("guard band");
  });

  it("is reopened until an attempt arrives after the reopening", () => {
    const reopened = { afterArrival: 5, reason: "Wrong probe." };
    expect(stateOf([history({ id: "a", last: good(5), reopened })], "a")).toMatchObject({
      state: "reopened",
      reason: "Reopened: Wrong probe.",
    });
    expect(stateOf([history({ id: "a", last: good(6), reopened })], "a")?.state).toBe("passed");
  });

  it("is conceded only while the concession names the attempt that counts", () => {
    const concessions = [{ attemptId: "bad-1", reason: "Ripple is fine for this card." }];
    expect(stateOf([history({ id: "a", last: bad(1), failedArrival: 1, concessions })], "a")).toMatchObject({
      state: "conceded",
      reason: "Accepted: Ripple is fine for this card.",
    });
    expect(stateOf([history({ id: "a", last: bad(2), failedArrival: 2, concessions })], "a")?.state).toBe("failed");
  });

  it("keeps its pass when an earlier hold point is reopened, but nothing may be recorded on it", () => {
    const unit = [
      history({
        id: "h",
        holdPoint: true,
        position: 1,
        last: good(1),
        reopened: { afterArrival: 1, reason: "look again" },
      }),
      history({ id: "b", position: 2, last: good(2) }),
    ];
    expect(stateOf(unit, "b")).toMatchObject({ state: "passed" });
    expect(stateOf(unit, "b")?.blockers).toHaveLength(1);
  });
});

describe("a rework", () => {
  const reworked = { afterArrival: 5, reason: "Bodge wire W3: it covers PH7; the rework touches it." };

  it("puts a passed check in doubt, with its reason, until an attempt arrives after it", () => {
    expect(stateOf([history({ id: "a", last: good(5), reworked })], "a")).toMatchObject({
      state: "doubtful",
      reason: reworked.reason,
    });
    expect(stateOf([history({ id: "a", last: good(6), reworked })], "a")).toMatchObject({
      state: "passed",
      reason: "",
    });
  });

  it("changes nothing where there is no pass to doubt", () => {
    expect(stateOf([history({ id: "a", reworked })], "a")?.state).toBe("untested");
    expect(stateOf([history({ id: "a", last: bad(5), failedArrival: 5, reworked })], "a")?.state).toBe("failed");
    const reopened = { afterArrival: 5, reason: "again" };
    expect(stateOf([history({ id: "a", last: good(5), reworked, reopened })], "a")?.state).toBe("reopened");
  });

  it("and a failure that the check relies on are both said", () => {
    const machine = [
      history({ id: "a", last: bad(7), failedArrival: 7, position: 1 }),
      history({ id: "b", last: good(5), reworked, needs: ["a"], position: 2 }),
    ];
    expect(stateOf(machine, "b")?.reason).toBe(
      `${reworked.reason} “a” failed afterwards, and this check relies on it.`,
    );
  });

  it("never makes fewer checks doubtful, whatever else happened", () => {
    fc.assert(
      fc.property(machines, fc.nat(23), fc.integer({ min: 1, max: 60 }), (machine, at, afterArrival) => {
        const doubtful = (list: CheckHistory[]) =>
          [...deriveStates(list).values()].flatMap(({ id, state }) => (state === "doubtful" ? [id] : []));
        const more = machine.map((check, index) =>
          index === at && (check.reworked?.afterArrival ?? 0) < afterArrival
            ? { ...check, reworked: { afterArrival, reason: "R2 touched it." } }
            : check,
        );
        expect(doubtful(more)).toEqual(expect.arrayContaining(doubtful(machine)));
      }),
    );
  });
});

describe("doubt", () => {
  it("falls on a passed check when what it relies on fails afterwards, through any number of steps", () => {
    const machine = [
      history({ id: "rail", last: bad(9), failedArrival: 9 }),
      history({ id: "clock", unitId: "tim", serial: "TIM-01", needs: ["rail"], last: good(2) }),
      history({ id: "sum", unitId: "sum", serial: "SUM-01", needs: ["clock"], last: good(3) }),
    ];
    expect(stateOf(machine, "clock")).toMatchObject({
      state: "doubtful",
      reason: "“rail” of PSU-01 failed afterwards, and this check relies on it.",
    });
    expect(stateOf(machine, "sum")?.state).toBe("doubtful");
  });

  it("stays after the mend until the check itself is repeated", () => {
    const rail = history({ id: "rail", holdPoint: true, last: good(10), failedArrival: 9, position: 1 });
    expect(stateOf([rail, history({ id: "b", position: 2, last: good(2) })], "b")?.state).toBe("doubtful");
    expect(stateOf([rail, history({ id: "b", position: 2, last: good(11) })], "b")?.state).toBe("passed");
  });

  it("does not fall from a failure that came before, nor through a lifted hold point", () => {
    const before = history({ id: "h", holdPoint: true, last: bad(1), failedArrival: 1, position: 1 });
    expect(stateOf([before, history({ id: "b", position: 2, last: good(2) })], "b")?.state).toBe("passed");
    const lifted = history({ id: "h", holdPoint: true, lifted: true, last: bad(5), failedArrival: 5, position: 1 });
    expect(stateOf([lifted, history({ id: "b", position: 2, last: good(2) })], "b")?.state).toBe("passed");
  });
});

describe("whatever the history", () => {
  it("gives the same states for the rows in any order", () => {
    fc.assert(
      fc.property(machines, fc.infiniteStream(fc.nat()), (machine, random) => {
        const shuffled = machine.map((one) => ({ one, at: random.next().value ?? 0 })).sort((a, b) => a.at - b.at);
        const other = deriveStates(shuffled.map(({ one }) => one));
        expect(new Map([...other].sort())).toEqual(new Map([...deriveStates(machine)].sort()));
      }),
    );
  });

  it("gives the same states again, and changes nothing in what it was given", () => {
    fc.assert(
      fc.property(machines, (machine) => {
        const copy = structuredClone(machine);
        expect(deriveStates(machine)).toEqual(deriveStates(machine));
        expect(machine).toEqual(copy);
      }),
    );
  });

  it("waits exactly when there is no valid attempt and something before it does not hold", () => {
    fc.assert(
      fc.property(machines, (machine) => {
        const derived = deriveStates(machine);
        for (const check of machine) {
          const own = derived.get(check.id);
          const behind = machine.filter(
            (other) =>
              (check.needs.includes(other.id) ||
                (other.unitId === check.unitId &&
                  other.position < check.position &&
                  other.holdPoint &&
                  !other.lifted)) &&
              !holds(derived.get(other.id)?.state ?? "untested"),
          );
          expect(own?.blockers.map((one) => one.checkId).sort()).toEqual(behind.map((one) => one.id).sort());
          expect(own?.state === "waiting").toBe(check.last === null && behind.length > 0);
        }
      }),
    );
  });

  it("returns to where it was when the last attempt is taken back", () => {
    fc.assert(
      fc.property(machines, fc.nat(), fc.boolean(), (machine, pick, conforms) => {
        const before = deriveStates(machine);
        const target = machine[pick % Math.max(1, machine.length)];
        if (!target) return;
        const attempt = conforms ? good(100) : bad(100);
        const recorded = { ...target, last: attempt, failedArrival: conforms ? target.failedArrival : 100 };
        const after = deriveStates(machine.map((one) => (one.id === target.id ? recorded : one)));
        expect(after.get(target.id)?.state).toBe(conforms ? "passed" : "failed");
        const voided = { ...recorded, last: target.last, failedArrival: target.failedArrival };
        expect(deriveStates(machine.map((one) => (one.id === target.id ? voided : one)))).toEqual(before);
      }),
    );
  });
});
