import type { BenchSession, CheckEvent } from "./history";
import type { Week } from "./outlook";

export const WEEK_MS = 7 * 24 * 3600 * 1000;

/** Half a year: what was before says little of now. Common practice, no source. */
const MOST_WEEKS = 26;

/** What an event does to the number of checks that hold. */
type Step = { atMs: number; change: -1 | 0 | 1; isRepeat: boolean };

/**
 * The whole weeks before now, the oldest first, from the first attempt on: seven days each, counted back from now, so that
 * no time zone matters. Weeks without work are among them. What is left of a week at the beginning is left out.
 */
export function weeksOfHistory(
  events: readonly CheckEvent[],
  sessions: readonly BenchSession[],
  nowMs: number,
): Week[] {
  const steps = replay(events.filter(({ atMs }) => atMs <= nowMs));
  const first = steps[0]?.atMs ?? nowMs;
  const count = Math.min(MOST_WEEKS, Math.floor((nowMs - first) / WEEK_MS));
  const weeks = Array.from({ length: count }, (_, at): Week => {
    return { startMs: nowMs - (count - at) * WEEK_MS, gained: 0, lost: 0, repeats: 0, sessions: 0 };
  });
  // A week is what came after its start up to and with its end: now belongs to the last one.
  const weekOf = (atMs: number) => weeks[count - 1 - Math.floor((nowMs - atMs) / WEEK_MS)];
  for (const { atMs, change, isRepeat } of steps) {
    const week = weekOf(atMs);
    if (!week) continue;
    if (change > 0) week.gained += 1;
    if (change < 0) week.lost += 1;
    if (isRepeat) week.repeats += 1;
  }
  for (const { startMs } of sessions) {
    const week = startMs <= nowMs ? weekOf(startMs) : undefined;
    if (week) week.sessions += 1;
  }
  return weeks;
}

function replay(events: readonly CheckEvent[]): Step[] {
  const holding = new Set<string>();
  const attempted = new Set<string>();
  return [...events]
    .sort((a, b) => a.atMs - b.atMs)
    .map(({ atMs, checkId, what }) => {
      const isAttempt = what === "conforms" || what === "does-not-conform";
      const isRepeat = isAttempt && attempted.has(checkId);
      if (isAttempt) attempted.add(checkId);
      const held = holding.has(checkId);
      const holds = what === "conforms" || what === "conceded";
      if (holds) holding.add(checkId);
      else holding.delete(checkId);
      return { atMs, change: held === holds ? 0 : holds ? 1 : -1, isRepeat };
    });
}
