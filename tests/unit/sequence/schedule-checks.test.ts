import { describe, expect, test } from "vitest";
import { scheduleChecks, type ScheduleRequest } from "@/lib/calc/sequence";
import { standing } from "../../support/standing-checks";

const PACES = { inspection: 60, continuity: 120, "power-on": 300, function: 600, integration: 900 };

const open = (given: Parameters<typeof standing>[0]) => standing({ state: "untested", ...given });

function plan(checks: Parameters<typeof scheduleChecks>[0], request: Partial<ScheduleRequest>, paces = PACES) {
  const answer = scheduleChecks(checks, { builders: 1, seconds: 45 * 60, ...request }, paces);
  if (!answer.ok) throw new Error(answer.message);
  return answer.value;
}

const machine = [
  open({ id: "rail", serial: "PSU-01", stage: "power-on", position: 2, holdPoint: true, title: "+5 V alone" }),
  open({ id: "load", serial: "PSU-01", stage: "function", position: 3 }),
  open({ id: "ohms", serial: "SUM-01", stage: "continuity", position: 1, holdPoint: true, title: "Ohms" }),
  open({ id: "adds", serial: "SUM-01", stage: "function", position: 2, needs: ["rail"] }),
  open({ id: "rack", serial: "SUM-01", stage: "integration", position: 3 }),
];

const told = (lines: ReturnType<typeof plan>["lines"]) =>
  lines.map(({ checkId, builder, startS, endS }) => [checkId, builder, startS, endS]);

describe("Forty-five minutes", () => {
  test("hold what one builder can do, each check after what it waits for, with the reason", () => {
    const { lines, left, usedS, sentence } = plan(machine, {});
    expect(told(lines)).toEqual([
      ["ohms", 1, 0, 120],
      ["rail", 1, 120, 420],
      ["load", 1, 420, 1020],
      ["rack", 1, 1020, 1920],
      ["adds", 1, 1920, 2520],
    ]);
    expect({ left, usedS }).toEqual({ left: 0, usedS: 2520 });
    expect(sentence).toBe("5 checks in about 42\u202fmin; nothing is left.");
    expect(lines.map(({ reason }) => reason)).toEqual([
      "It is a hold point; 2 checks of SUM-01 wait for it.",
      "It is a hold point; 1 check of PSU-01 and 1 of SUM-01 wait for it.",
      "It has not been done; nothing waits for it. Free once “+5 V alone” is done.",
      "It has not been done; nothing waits for it. Free once “Ohms” is done.",
      "It has not been done; nothing waits for it. Free once “+5 V alone” of PSU-01 is done.",
    ]);
  });

  test("are over sooner with two builders, who never have one board in hand at once", () => {
    const { lines, usedS } = plan(machine, { builders: 2 });
    expect(told(lines)).toEqual([
      ["ohms", 1, 0, 120],
      ["rail", 2, 0, 300],
      ["rack", 1, 120, 1020],
      ["load", 2, 300, 900],
      ["adds", 1, 1020, 1620],
    ]);
    expect(usedS).toBe(1620);
  });
});

describe("Less time", () => {
  test("leaves out what does not fit and fills the rest with something shorter", () => {
    const { lines, left, sentence } = plan(machine, { seconds: 8 * 60 });
    expect(lines.map(({ checkId }) => checkId)).toEqual(["ohms", "rail"]);
    expect(left).toBe(3);
    expect(sentence).toBe("2 checks in about 7\u202fmin; 3 left.");
  });

  test("than the shortest check takes says so", () => {
    const { lines, sentence } = plan(machine, { seconds: 60 });
    expect(lines).toEqual([]);
    expect(sentence).toBe("No check fits into 1\u202fmin: the shortest takes about 2\u202fmin.");
  });

  test("than anything needs, with nothing left to do, is no trouble", () => {
    expect(plan([standing({ id: "done" })], { seconds: 60 }).sentence).toBe("Every check holds.");
  });
});

test("Only one builder at a time works in the rack", () => {
  const checks = ["TIM-01", "SUM-01"].map((serial) => open({ id: serial, serial, stage: "integration" }));
  expect(told(plan(checks, { builders: 2 }).lines)).toEqual([
    ["SUM-01", 1, 0, 900],
    ["TIM-01", 1, 900, 1800],
  ]);
});

test("Of equal checks the board on the bench comes first", () => {
  const checks = [
    open({ id: "a1", serial: "AAA-01", position: 1 }),
    open({ id: "b1", serial: "BBB-01", position: 1, holdPoint: true }),
    open({ id: "b2", serial: "BBB-01", position: 2 }),
  ];
  expect(plan(checks, {}).lines.map(({ checkId }) => checkId)).toEqual(["b1", "b2", "a1"]);
});

test("Without any pace five minutes stand in, and the plan says that it guesses", () => {
  const none = { inspection: null, continuity: null, "power-on": null, function: null, integration: null };
  const answer = scheduleChecks([open({ id: "a" })], { builders: 1, seconds: 600 }, none);
  expect(answer).toMatchObject({
    value: {
      usedS: 300,
      isGuess: true,
      sentence: "1 check in about 5\u202fmin, guessed where no pace is known yet; nothing is left.",
    },
  });
});

test("A circle is refused by name", () => {
  const checks = [
    open({ id: "a", title: "A", needs: ["b"], position: 1 }),
    open({ id: "b", title: "B", needs: ["a"], position: 2 }),
  ];
  expect(scheduleChecks(checks, { builders: 1, seconds: 600 })).toEqual({
    ok: false,
    circle: ["a", "b"],
    message: "“A” waits for “B”, which waits for “A”.",
  });
});
