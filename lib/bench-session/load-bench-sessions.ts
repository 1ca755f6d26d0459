import { database } from "@/db/client";
import { findAttemptTimes, findBuilders, findTypedSessions } from "@/db/queries/bench-sessions";
import { SESSION_GAP_S } from "@/db/queries/work-history";
import type { ProjectScope } from "@/lib/access/scope";
import { findPaces, inferSessions, type BenchSession } from "@/lib/calc/forecast";
import { stageName, STAGES } from "@/lib/procedure/stages";
import { attemptsAt } from "./attempts-at";
import { pacesFor } from "./paces-for";
import type { BenchSessionsView, PaceLine, SessionLine } from "./sessions-view";

const HALF_A_YEAR_MS = 182 * 86_400_000;

/** Who was at the bench, when, for how long and what came of it; and how long a check takes in each stage. */
export async function loadBenchSessions(scope: ProjectScope, now = new Date()): Promise<BenchSessionsView> {
  const db = database();
  const since = new Date(now.getTime() - HALF_A_YEAR_MS);
  const [rows, typedRows, people] = await Promise.all([
    findAttemptTimes(db, scope, since),
    findTypedSessions(db, scope, since),
    findBuilders(db, scope),
  ]);
  const typed = typedRows.map(({ userId, startedAt, endedAt }) => ({
    builder: userId,
    startMs: startedAt.getTime(),
    endMs: endedAt?.getTime() ?? null,
  }));
  const sessions = inferSessions(attemptsAt(rows), { typed, gapS: SESSION_GAP_S });
  const serials = new Map(rows.map(({ checkId, serial }) => [checkId, serial]));
  const names = new Map(people.map(({ id, name }) => [id, name]));
  const isOpen = (session: BenchSession) =>
    typed.some((one) => one.endMs === null && one.builder === session.builder && one.startMs === session.startMs);
  const { userId } = scope.viewer;
  const lines = sessions.map((session): SessionLine => {
    const units = [...new Set(session.attempts.flatMap(({ checkId }) => serials.get(checkId) ?? []))].sort();
    return {
      key: `${session.builder} ${session.startMs}`,
      builder: names.get(session.builder) ?? "Somebody",
      isOwn: session.builder === userId,
      startedAt: new Date(session.startMs).toISOString(),
      seconds: (session.endMs - session.startMs) / 1000,
      typed: session.typed,
      isRunning: isOpen(session) && now.getTime() - session.endMs <= SESSION_GAP_S * 1000,
      attempts: session.attempts.length,
      stages: session.stages.map(({ stage, attempts }) => `${attempts} ${stageName(stage).toLowerCase()}`).join(", "),
      units,
    };
  });
  const everybody = findPaces(sessions);
  const own = findPaces(sessions.filter(({ builder }) => builder === userId));
  return {
    sessions: lines.reverse(),
    running: lines.find(({ isOwn, isRunning }) => isOwn && isRunning)?.startedAt ?? null,
    paces: pacesFor(own, everybody),
    paceLines: STAGES.map(({ id, name }): PaceLine => {
      return { stage: id, name, ownS: own[id], everybodyS: everybody[id] };
    }),
  };
}
