import { database } from "@/db/client";
import { findAttemptTimes, findTypedSessions } from "@/db/queries/bench-sessions";
import type { ProjectScope } from "@/lib/access/scope";
import { attemptsAt } from "./attempts-at";
import { endOfSession } from "./end-of-session";

const DAY_MS = 86_400_000;

/** Whether a session that the viewer started still runs. One that is older than a day does not matter any more. */
export async function isAtBench(scope: ProjectScope, now = new Date()): Promise<boolean> {
  const db = database();
  const { userId } = scope.viewer;
  const since = new Date(now.getTime() - DAY_MS);
  const typed = await findTypedSessions(db, scope, since);
  const open = typed.find((one) => one.userId === userId && one.endedAt === null);
  if (!open) return false;
  const attempts = attemptsAt(await findAttemptTimes(db, scope, open.startedAt));
  const session = { builder: userId, startMs: open.startedAt.getTime() };
  return !endOfSession(session, attempts, now.getTime()).isOver;
}
