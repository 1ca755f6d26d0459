import { describe, expect, test } from "vitest";
import { forecast, inferSessions, type CheckEvent, type Forecast } from "@/lib/calc/forecast";

const DAY = 24 * 3600 * 1000;
const WEEK = 7 * DAY;
const NOW = Date.UTC(2026, 10, 29, 20);

/** A new check passes at each of these instants. */
const passes = (instants: readonly number[]): CheckEvent[] =>
  instants.map((atMs, at) => ({ atMs, checkId: `c${at}`, what: "conforms" }));

const everyDay = (days: number) => passes(Array.from({ length: days }, (_, at) => NOW - (days - 1 - at) * DAY));

const sessionsOf = (events: readonly CheckEvent[]) =>
  inferSessions(events.map(({ atMs, checkId }) => ({ atMs, checkId, stage: "function", builder: "bram" })));

const ask = (events: readonly CheckEvent[], remaining: number, seed = 1): Forecast =>
  forecast({ events, sessions: sessionsOf(events), remaining, nowMs: NOW, seed });

function dated(answer: Forecast) {
  if (answer.kind !== "forecast") throw new Error(`No date: ${answer.sentence}`);
  return answer;
}

describe("A constant pace", () => {
  test.each([
    [7, 1],
    [28, 4],
    [10, 10 / 7],
    [1, 1 / 7],
  ])("of one check a day has %d checks done in exactly that many days, surely", (remaining, weeks) => {
    const answer = dated(ask(everyDay(29), remaining));
    expect(answer.perWeek).toBe(7);
    expect(answer.half.atMs).toBe(NOW + Math.round(weeks * WEEK));
    expect(answer.most).toEqual(answer.half);
    expect(answer.half.sessions).toBe(Math.ceil(remaining));
    expect(answer.weeks).toHaveLength(4);
  });

  test("says the pace in words", () => {
    expect(dated(ask(everyDay(29), 1)).sentence).toBe("1 check is left; the last 4 weeks brought 7 each.");
  });
});

describe("An uneven pace", () => {
  /** Alternately nothing and ten checks a week, for eight weeks. */
  const uneven = passes(
    [7, 5, 3, 1].flatMap((week) => Array.from({ length: 10 }, (_, at) => NOW - week * WEEK + (at + 1) * 3600_000)),
  );

  test("has the later date for the surer answer", () => {
    const { half, most } = dated(ask(uneven, 40));
    expect(most?.atMs).toBeGreaterThan(half.atMs);
  });

  test("of ten checks every other week ends like the toss of a coin", () => {
    // The first good week is the n-th in 2⁻ⁿ of all cases: half by week 1 (or 2, as the draws fall), 85 % by week 3. Computed.
    const { half, most } = dated(ask(uneven, 10));
    expect([NOW + WEEK, NOW + 2 * WEEK]).toContain(half.atMs);
    expect(most?.atMs).toBe(NOW + 3 * WEEK);
  });

  test("gives the same dates for the same seed, and about the same for another", () => {
    expect(ask(uneven, 60, 5)).toEqual(ask(uneven, 60, 5));
    const [one, other] = [dated(ask(uneven, 60, 5)), dated(ask(uneven, 60, 6))];
    expect(Math.abs(one.half.atMs - other.half.atMs)).toBeLessThanOrEqual(WEEK);
  });
});

describe("Checks that are lost again", () => {
  test("slow the pace: a pass, a doubt and the repeat count as one gain", () => {
    const events = everyDay(29).flatMap((pass): CheckEvent[] => [
      pass,
      { ...pass, atMs: pass.atMs + 1, what: "doubtful" },
      { ...pass, atMs: pass.atMs + 2, what: "conforms" },
    ]);
    const answer = dated(forecast({ events, sessions: [], remaining: 7, nowMs: NOW + 2, seed: 1 }));
    expect(answer.perWeek).toBe(7);
    expect(answer.weeks.at(-1)).toMatchObject({ gained: 14, lost: 7, repeats: 7, sessions: 0 });
    expect(answer.half).toEqual({ atMs: NOW + 2 + WEEK, sessions: null });
  });

  test.each<CheckEvent["what"]>(["doubtful", "reopened", "does-not-conform", "withdrawn"])(
    "as fast as they come leave no date (%s)",
    (what) => {
      const events = everyDay(29).flatMap((pass) => [pass, { ...pass, atMs: pass.atMs + 1, what }]);
      const answer = forecast({ events, sessions: [], remaining: 7, nowMs: NOW + 1, seed: 1 });
      expect(answer).toMatchObject({
        kind: "standing still",
        sentence: "The last 4 weeks lost as many checks as they gained: at this pace there is no date.",
      });
    },
  );

  test("cost nothing when they did not hold, and a concession counts like a pass", () => {
    const events = everyDay(29).flatMap((pass): CheckEvent[] => [
      { ...pass, what: "reopened" },
      { ...pass, what: "does-not-conform" },
      { ...pass, what: "conceded" },
      { ...pass, what: "conforms" },
    ]);
    expect(dated(ask(events, 7)).weeks.at(-1)).toMatchObject({ gained: 7, lost: 0, repeats: 7 });
  });
});

describe("There is no date", () => {
  test("under three weeks of history", () => {
    expect(ask(everyDay(21), 5)).toMatchObject({
      kind: "not enough history",
      sentence: "Not enough history: a forecast needs 3 weeks since the first attempt, and there are 2.",
    });
    expect(ask(everyDay(8), 5).sentence).toContain("and there is 1.");
    expect(ask([], 5).sentence).toContain("and there is less than one.");
    expect(ask(everyDay(22), 5).kind).toBe("forecast");
  });

  test("where everything holds", () => {
    expect(ask([], 0)).toEqual({ kind: "done", sentence: "Every check holds." });
  });
});

test("Weeks without work count, and only the last half year does", () => {
  const longAgo = passes([NOW - 40 * WEEK]);
  const answer = ask([...longAgo, ...everyDay(3).map((event) => ({ ...event, checkId: `late ${event.checkId}` }))], 3);
  expect(dated(answer).weeks).toHaveLength(26);
  expect(dated(answer).perWeek).toBeCloseTo(3 / 26, 12);
});
