import { SESSION_GAP_S } from "@/db/queries/work-history";
import { inferSessions, type AttemptAt } from "@/lib/calc/forecast";

type Open = { builder: string; startMs: number };

/** How far a session that nobody stopped reaches: to its last attempt; and whether the gap after it has ended it. */
export function endOfSession({ builder, startMs }: Open, attempts: readonly AttemptAt[], nowMs: number) {
  const typed = [{ builder, startMs, endMs: null }];
  const own = inferSessions(attempts, { typed, gapS: SESSION_GAP_S }).find((one) => one.typed);
  const endMs = own?.endMs ?? startMs;
  return { endMs, isOver: nowMs - endMs > SESSION_GAP_S * 1000 };
}
