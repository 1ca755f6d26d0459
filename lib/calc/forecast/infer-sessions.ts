import { CHECK_STAGES } from "../check-graph";
import type { AttemptAt, BenchSession, TypedSession } from "./history";

/** Longer without an attempt: the builder has left the bench. Common practice, no source. */
const GAP_S = 90 * 60;

/**
 * Bench sessions, from those that were started and stopped by hand and, for the other attempts, from the gaps between them:
 * a builder's attempts belong together while none is more than `gapS` after the one before. A session that nobody stopped
 * ends by the same gap. One builder's sessions only: two people at two benches are two sessions. By time of beginning.
 * Left out: work at the bench that records nothing, unless it was started and stopped by hand.
 */
export function inferSessions(
  attempts: readonly AttemptAt[],
  { typed = [], gapS = GAP_S }: { typed?: readonly TypedSession[]; gapS?: number } = {},
): BenchSession[] {
  const builders = [...new Set([...attempts, ...typed].map(({ builder }) => builder))];
  return builders
    .flatMap((builder) => {
      const own = attempts.filter((attempt) => attempt.builder === builder).sort((a, b) => a.atMs - b.atMs);
      const hand = typed.filter((one) => one.builder === builder).sort((a, b) => a.startMs - b.startMs);
      return sessionsOf(builder, own, hand, gapS * 1000);
    })
    .sort((a, b) => a.startMs - b.startMs || (a.builder < b.builder ? -1 : 1));
}

function sessionsOf(
  builder: string,
  attempts: readonly AttemptAt[],
  typed: readonly TypedSession[],
  gapMs: number,
): BenchSession[] {
  const open = typed.map((one) => ({ ...one, lastMs: one.endMs ?? one.startMs, attempts: [] as AttemptAt[] }));
  const loose: AttemptAt[][] = [];
  for (const attempt of attempts) {
    const { atMs } = attempt;
    const within = open.find(({ startMs, endMs, lastMs }) => atMs >= startMs && atMs <= (endMs ?? lastMs + gapMs));
    const last = loose.at(-1);
    if (within) {
      within.attempts.push(attempt);
      within.lastMs = Math.max(within.lastMs, atMs);
    } else if (last && atMs - (last.at(-1)?.atMs ?? -Infinity) <= gapMs) {
      last.push(attempt);
    } else {
      loose.push([attempt]);
    }
  }
  return [
    ...open.map(({ startMs, lastMs, attempts: own }) => session(builder, startMs, lastMs, true, own)),
    ...loose.map((own) => session(builder, own[0]?.atMs ?? 0, own.at(-1)?.atMs ?? 0, false, own)),
  ];
}

function session(
  builder: string,
  startMs: number,
  endMs: number,
  isTyped: boolean,
  attempts: AttemptAt[],
): BenchSession {
  const stages = CHECK_STAGES.flatMap((stage) => {
    const count = attempts.filter((attempt) => attempt.stage === stage).length;
    return count === 0 ? [] : [{ stage, attempts: count }];
  });
  return { builder, startMs, endMs, typed: isTyped, attempts, stages };
}
