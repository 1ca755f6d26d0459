import { describe, expect, test } from "vitest";
import { orderChecks } from "@/lib/calc/sequence";
import { standing } from "../../support/standing-checks";

const PACES = { inspection: 60, continuity: 120, "power-on": 300, function: 600, integration: 900 };

const open = (given: Parameters<typeof standing>[0]) => standing({ state: "untested", ...given });

function order(checks: Parameters<typeof orderChecks>[0], paces?: Parameters<typeof orderChecks>[1]) {
  const answer = orderChecks(checks, paces);
  if (!answer.ok) throw new Error(answer.message);
  return answer.value;
}

/** A supply with two holds, and two cards that wait for it. */
const machine = [
  open({ id: "look", serial: "PSU-01", stage: "inspection", position: 1 }),
  open({ id: "rail", serial: "PSU-01", stage: "power-on", position: 2, holdPoint: true, title: "+5 V alone" }),
  open({ id: "ripple", serial: "PSU-01", stage: "function", position: 3 }),
  open({ id: "load", serial: "PSU-01", stage: "function", position: 4, holdPoint: true, state: "failed" }),
  open({ id: "tim", serial: "TIM-01", stage: "integration", needs: ["load"], title: "Clock in the rack" }),
  open({ id: "sum", serial: "SUM-01", stage: "integration", needs: ["tim", "ripple"], title: "Adds" }),
];

describe("What can be done now", () => {
  test("is what waits for nothing that is open, first what lets go most, with the reason in words", () => {
    const { now, open: all } = order(machine);
    expect(now).toEqual(["rail", "look"]);
    const reasons = Object.fromEntries(all.map(({ checkId, reason }) => [checkId, reason]));
    expect(reasons).toMatchObject({
      rail: "It is a hold point; 2 checks of PSU-01, 1 of SUM-01 and 1 of TIM-01 wait for it.",
      look: "It has not been done; nothing waits for it.",
      ripple: "1 check of SUM-01 waits for it.",
      load: "It fails and is a hold point; 1 check of SUM-01 and 1 of TIM-01 wait for it.",
    });
  });

  test("changes as checks hold: a concession lets go like a pass, and a lifted hold binds nobody", () => {
    const after = (state: "passed" | "conceded") =>
      order(machine.map((check) => (check.id === "rail" ? { ...check, state } : check))).now;
    expect(after("passed")).toEqual(["load", "ripple", "look"]);
    expect(after("conceded")).toEqual(["load", "ripple", "look"]);
    const lifted = machine.map((check) => (check.id === "rail" ? { ...check, lifted: true } : check));
    expect(order(lifted).now).toEqual(["load", "ripple", "look", "rail"]);
  });

  test("of checks that let go as much puts what fails before what is reopened, in doubt and not done", () => {
    const checks = (["untested", "doubtful", "reopened", "failed"] as const).map((state, position) =>
      open({ id: state, state, position }),
    );
    expect(order(checks).now).toEqual(["failed", "reopened", "doubtful", "untested"]);
    expect(order(checks).open.map(({ reason }) => reason)).toEqual([
      "It has not been done; nothing waits for it.",
      "It is in doubt; nothing waits for it.",
      "It was reopened; nothing waits for it.",
      "It fails; nothing waits for it.",
    ]);
  });

  test("counts many units together", () => {
    const checks = [
      open({ id: "hold", serial: "BPL-01", holdPoint: true }),
      ...[1, 2, 3, 4, 5].map((at) => open({ id: `con${at}`, serial: `CON-0${at}`, needs: ["hold"] })),
    ];
    expect(order(checks).open[0]?.reason).toBe(
      "It is a hold point; 1 check of CON-01, 1 of CON-02 and 3 of 3 other units wait for it.",
    );
  });
});

describe("What each open check lets go", () => {
  test("at once and altogether", () => {
    const facts = order(machine).open.map(({ checkId, waitsFor, frees, holdsBack }) => ({
      checkId,
      waitsFor,
      frees,
      holdsBack,
    }));
    expect(facts).toEqual([
      { checkId: "look", waitsFor: [], frees: [], holdsBack: 0 },
      { checkId: "rail", waitsFor: [], frees: ["ripple", "load"], holdsBack: 4 },
      { checkId: "ripple", waitsFor: ["rail"], frees: [], holdsBack: 1 },
      { checkId: "load", waitsFor: ["rail"], frees: ["tim"], holdsBack: 2 },
      { checkId: "tim", waitsFor: ["load"], frees: [], holdsBack: 1 },
      { checkId: "sum", waitsFor: ["tim", "ripple"], frees: [], holdsBack: 0 },
    ]);
  });
});

describe("The longest chain", () => {
  test("goes by expected time, from the first check to the last", () => {
    const { critical } = order(machine, PACES);
    expect(critical?.steps).toEqual([
      { checkId: "rail", expectedS: 300, startS: 0 },
      { checkId: "load", expectedS: 600, startS: 300 },
      { checkId: "tim", expectedS: 900, startS: 900 },
      { checkId: "sum", expectedS: 900, startS: 1800 },
    ]);
    expect(critical?.sentence).toBe(
      "The longest chain is 4 checks, from “+5 V alone” of PSU-01 to “Adds” of SUM-01: about 45\u202fmin.",
    );
  });

  test("says where it guesses, and there is none when everything holds", () => {
    expect(order(machine, { ...PACES, function: null }).critical).toMatchObject({ totalS: 300 + 210 + 900 + 900 });
    expect(order(machine, { ...PACES, function: null }).critical?.sentence).toContain("guessed where no pace");
    expect(order([open({ id: "one" })]).critical).toMatchObject({ totalS: 300, isGuess: true });
    expect(order([standing({ id: "done" })]).critical).toBeNull();
  });
});

describe("A circle is refused", () => {
  test("and its members are named in order", () => {
    const checks = [
      open({ id: "a", title: "A", serial: "TIM-01", needs: ["c"] }),
      open({ id: "b", title: "B", serial: "SUM-01", needs: ["a"] }),
      open({ id: "c", title: "C", serial: "TIM-01", needs: ["b", "d"] }),
      open({ id: "d", title: "D", serial: "PSU-01" }),
    ];
    expect(orderChecks(checks)).toEqual({
      ok: false,
      circle: ["b", "a", "c"],
      message: "“B” waits for “A” of TIM-01, which waits for “C” of TIM-01, which waits for “B”.",
    });
  });

  test("through a hold point too, even where the members hold", () => {
    const checks = [
      standing({ id: "hold", title: "Hold", position: 1, holdPoint: true, needs: ["after"] }),
      standing({ id: "after", title: "After", position: 2 }),
    ];
    expect(orderChecks(checks)).toMatchObject({ message: "“Hold” waits for “After”, which waits for “Hold”." });
  });

  test("of one check that waits for itself", () => {
    expect(orderChecks([open({ id: "a", title: "A", needs: ["a"] })])).toMatchObject({
      message: "“A” waits for itself.",
    });
  });
});
