import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { findPaces, inferSessions, type AttemptAt } from "@/lib/calc/forecast";

const MINUTE = 60_000;

const attempt = (minutes: number, more: Partial<AttemptAt> = {}): AttemptAt => ({
  atMs: minutes * MINUTE,
  checkId: `c${minutes}`,
  stage: "function",
  builder: "bram",
  ...more,
});

const spans = (list: ReturnType<typeof inferSessions>) =>
  list.map(({ builder, startMs, endMs, typed, attempts }) => [
    builder,
    startMs / MINUTE,
    endMs / MINUTE,
    typed,
    attempts.length,
  ]);

describe("A bench session", () => {
  test("lasts while attempts are at most an hour and a half apart", () => {
    expect(spans(inferSessions([0, 90, 180, 271].map((at) => attempt(at))))).toEqual([
      ["bram", 0, 180, false, 3],
      ["bram", 271, 271, false, 1],
    ]);
  });

  test("is one builder's", () => {
    const found = inferSessions([attempt(0), attempt(5, { builder: "maud" }), attempt(10)]);
    expect(spans(found)).toEqual([
      ["bram", 0, 10, false, 2],
      ["maud", 5, 5, false, 1],
    ]);
  });

  test("that was started and stopped by hand has the attempts within, however far apart, and is one without any", () => {
    const typed = [
      { builder: "bram", startMs: 0, endMs: 300 * MINUTE },
      { builder: "bram", startMs: 1000 * MINUTE, endMs: 1060 * MINUTE },
    ];
    expect(spans(inferSessions([attempt(5), attempt(250), attempt(310)], { typed }))).toEqual([
      ["bram", 0, 300, true, 2],
      ["bram", 310, 310, false, 1],
      ["bram", 1000, 1060, true, 0],
    ]);
  });

  test("that nobody stopped ends with the first long gap", () => {
    const typed = [{ builder: "bram", startMs: 0, endMs: null }];
    expect(spans(inferSessions([attempt(60), attempt(140), attempt(300)], { typed }))).toEqual([
      ["bram", 0, 140, true, 2],
      ["bram", 300, 300, false, 1],
    ]);
  });

  test("says what was done, in the order of the work", () => {
    const [one] = inferSessions([attempt(0), attempt(5, { stage: "continuity" }), attempt(10)]);
    expect(one?.stages).toEqual([
      { stage: "continuity", attempts: 1 },
      { stage: "function", attempts: 2 },
    ]);
  });
});

describe("The pace of a stage", () => {
  test("is the median time since the attempt before, and none is known below three", () => {
    const continuity = [0, 2, 4, 9].map((at) => attempt(at, { stage: "continuity" }));
    const functions = [20, 35].map((at) => attempt(at));
    expect(findPaces(inferSessions([...continuity, ...functions]))).toEqual({
      inspection: null,
      continuity: 120,
      "power-on": null,
      function: null,
      integration: null,
    });
  });

  test("does not count the night between two sessions", () => {
    const days = [0, 24 * 60, 48 * 60].flatMap((day) => [attempt(day), attempt(day + 3), attempt(day + 6)]);
    expect(findPaces(inferSessions(days)).function).toBe(180);
  });

  test("of an even number of times is the mean of the two in the middle", () => {
    expect(findPaces(inferSessions([0, 1, 3, 7, 15].map((at) => attempt(at)))).function).toBe(180);
  });
});

test("Every attempt is in exactly one session of its builder, and sessions of one builder do not overlap", () => {
  const attempts = fc.array(fc.record({ minutes: fc.nat(2000), builder: fc.constantFrom("bram", "maud") }), {
    maxLength: 40,
  });
  fc.assert(
    fc.property(attempts, fc.integer({ min: 1, max: 200 }), (drawn, gap) => {
      const given = drawn.map(({ minutes, builder }, at) => attempt(minutes, { builder, checkId: `c${at}` }));
      const found = inferSessions(given, { gapS: gap * 60 });
      expect(found.flatMap((one) => one.attempts.map(({ checkId }) => checkId)).sort()).toEqual(
        given.map(({ checkId }) => checkId).sort(),
      );
      for (const builder of ["bram", "maud"]) {
        const own = found.filter((one) => one.builder === builder);
        own.forEach((one, at) => {
          expect(one.attempts.every((each) => each.builder === builder)).toBe(true);
          const next = own[at + 1];
          if (next) expect(next.startMs - one.endMs).toBeGreaterThan(gap * MINUTE);
        });
      }
    }),
  );
});
