import fc from "fast-check";
import { expect, test } from "vitest";
import { forecast, inferSessions, type CheckEvent, type Forecast } from "@/lib/calc/forecast";

const DAY = 24 * 3600 * 1000;
const WEEK = 7 * DAY;
const NOW = Date.UTC(2026, 10, 29, 20);

function ask(events: readonly CheckEvent[], remaining: number, seed: number): Forecast {
  const attempts = events.map(({ atMs, checkId }) => ({ atMs, checkId, stage: "function" as const, builder: "bram" }));
  return forecast({ events, sessions: inferSessions(attempts), remaining, nowMs: NOW, seed });
}

function dated(answer: Forecast) {
  if (answer.kind !== "forecast") throw new Error(`No date: ${answer.sentence}`);
  return answer;
}

const histories = fc
  .array(
    fc.record({
      atMs: fc.integer({ min: NOW - 10 * WEEK + 1, max: NOW + DAY }),
      checkId: fc.integer({ min: 0, max: 30 }).map((at) => `c${at}`),
      what: fc.constantFrom<CheckEvent["what"]>("conforms", "conforms", "conforms", "does-not-conform", "doubtful"),
    }),
    { maxLength: 80 },
  )
  .map((drawn): CheckEvent[] => [{ atMs: NOW - 10 * WEEK, checkId: "first", what: "conforms" }, ...drawn]);

test("More that is left is never earlier and never fewer sessions; the surer date is never the earlier one", () => {
  fc.assert(
    fc.property(histories, fc.integer({ min: 1, max: 40 }), fc.nat(20), fc.nat(), (events, few, more, seed) => {
      const [sooner, later] = [ask(events, few, seed), ask(events, few + more, seed)];
      if (later.kind !== "forecast") return;
      const [one, other] = [dated(sooner), later];
      expect(other.half.atMs).toBeGreaterThanOrEqual(one.half.atMs);
      expect(other.half.sessions ?? 0).toBeGreaterThanOrEqual(one.half.sessions ?? 0);
      if (other.most) expect(other.most.atMs).toBeGreaterThanOrEqual(one.most?.atMs ?? Infinity);
      expect(one.most?.atMs ?? Infinity).toBeGreaterThanOrEqual(one.half.atMs);
      expect(one.half.atMs).toBeGreaterThan(NOW);
    }),
    { numRuns: 30 },
  );
});

test("What is gained less what is lost is what holds more than before", () => {
  fc.assert(
    fc.property(histories, (events) => {
      const answer = forecast({ events, sessions: [], remaining: 1000, nowMs: NOW, seed: 1 });
      if (answer.kind === "done") throw new Error("Something is left.");
      const held = new Set<string>();
      for (const { checkId, what } of [...events].sort((a, b) => a.atMs - b.atMs).filter(({ atMs }) => atMs <= NOW)) {
        if (what === "conforms") held.add(checkId);
        else held.delete(checkId);
      }
      const gained = answer.weeks.reduce((sum, week) => sum + week.gained - week.lost, 0);
      // The first attempt stands exactly at the beginning of the first week, which is no longer part of it.
      expect(gained).toBe(held.size - 1);
    }),
    { numRuns: 50 },
  );
});
