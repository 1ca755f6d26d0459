import { uniformInt } from "pure-rand/distribution/uniformInt";
import { xoroshiro128plus } from "pure-rand/generator/xoroshiro128plus";
import type { Forecast, ForecastInput, Week } from "./outlook";
import { quantile } from "./quantile";
import { WEEK_MS, weeksOfHistory } from "./weeks-of-history";

const LEAST_WEEKS = 3;
const RUNS = 2000;
/** Ten years: later says only that nobody knows. */
const MOST_WEEKS_AHEAD = 520;

/**
 * When the checks that are left will hold: a bootstrap over the weeks of the past (Efron, Bootstrap methods, Ann. Statist. 7,
 * 1979). Each of 2000 runs draws weeks of history with replacement, adds up what they gained less what they lost, and stops
 * where nothing is left; within the last week the time is proportional. Half of the runs are over by the first date, 85 of
 * 100 by the second. Sessions are counted along.
 *
 * Random numbers: xoroshiro128+ from the seed, one stream a run. The streams do not depend on what is left, so that more
 * left is never earlier with the same history and seed. Left out: checks that will still be added, and that weeks follow
 * each other with reason.
 */
export function forecast({ events, sessions, remaining, nowMs, seed }: ForecastInput): Forecast {
  if (remaining <= 0) return { kind: "done", sentence: "Every check holds." };
  const weeks = weeksOfHistory(events, sessions, nowMs);
  if (weeks.length < LEAST_WEEKS) return notEnough(weeks);
  const runs = drawRuns(weeks, remaining, seed);
  const by = (share: number) => {
    const inWeeks = quantile(
      runs.map((run) => run.weeks),
      share,
    );
    if (!Number.isFinite(inWeeks)) return null;
    const count = quantile(
      runs.map((run) => run.sessions),
      share,
    );
    return { atMs: Math.round(nowMs + inWeeks * WEEK_MS), sessions: count > 0 ? Math.ceil(count) : null };
  };
  const half = by(0.5);
  if (!half) return standingStill(weeks);
  const perWeek = weeks.reduce((sum, { gained, lost }) => sum + gained - lost, 0) / weeks.length;
  return { kind: "forecast", weeks, perWeek, half, most: by(0.85), sentence: say(remaining, perWeek, weeks.length) };
}

/** Weeks and sessions until nothing is left; infinite when that takes longer than anybody looks ahead. */
type Run = { weeks: number; sessions: number };

function drawRuns(weeks: readonly Week[], remaining: number, seed: number): Run[] {
  const stream = xoroshiro128plus(seed);
  return Array.from({ length: RUNS }, () => {
    const random = stream.clone();
    stream.jump();
    return drawRun(weeks, remaining, () => uniformInt(random, 0, weeks.length - 1));
  });
}

function drawRun(weeks: readonly Week[], remaining: number, draw: () => number): Run {
  let left = remaining;
  let sessions = 0;
  for (let count = 0; count < MOST_WEEKS_AHEAD; count += 1) {
    const week = weeks[draw()];
    if (!week) break;
    const net = week.gained - week.lost;
    if (net >= left) {
      const share = left / net;
      return { weeks: count + share, sessions: sessions + share * week.sessions };
    }
    left -= net;
    sessions += week.sessions;
  }
  return { weeks: Infinity, sessions: Infinity };
}

const checks = (count: number) => `${count} ${count === 1 ? "check is" : "checks are"} left`;

function say(remaining: number, perWeek: number, weeks: number): string {
  return `${checks(remaining)}; the last ${weeks} weeks brought ${Number(perWeek.toFixed(1))} each.`;
}

function notEnough(weeks: Week[]): Forecast {
  const have = weeks.length === 0 ? "less than one" : `${weeks.length}`;
  const sentence = `Not enough history: a forecast needs ${LEAST_WEEKS} weeks since the first attempt, and there ${weeks.length < 2 ? "is" : "are"} ${have}.`;
  return { kind: "not enough history", weeks, sentence };
}

const standingStill = (weeks: Week[]): Forecast => ({
  kind: "standing still",
  weeks,
  sentence: `The last ${weeks.length} weeks lost as many checks as they gained: at this pace there is no date.`,
});
