import { eq, sql } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import { findAttemptTimes, lockOpenSessions } from "@/db/queries/bench-sessions";
import { benchSessions } from "@/db/schema/order";
import type { ProjectScope } from "@/lib/access/scope";
import { attemptsAt } from "./attempts-at";
import { endOfSession } from "./end-of-session";

/** A builder starts one session at a time, also from two devices at once. */
const BENCH = 4111;

/** Writes down the end of sessions that ended by themselves; what is left is the one that runs, if any. */
export async function closeOpenSessions(tx: Transaction, scope: ProjectScope, now: Date) {
  const { userId } = scope.viewer;
  await tx.execute(sql`select pg_advisory_xact_lock(${BENCH}, hashtext(${`${scope.projectId} ${userId}`}))`);
  const open = await lockOpenSessions(tx, scope, userId);
  const first = open.at(-1);
  if (!first) return { running: undefined, closed: undefined };
  const attempts = attemptsAt(await findAttemptTimes(tx, scope, first.startedAt));
  const judged = open.map((row) => {
    const session = { builder: userId, startMs: row.startedAt.getTime() };
    return { ...row, ...endOfSession(session, attempts, now.getTime()) };
  });
  for (const { id, endMs } of judged.filter(({ isOver }) => isOver)) await endSession(tx, id, new Date(endMs));
  return { running: judged.find(({ isOver }) => !isOver), closed: judged.find(({ isOver }) => isOver) };
}

export const endSession = (tx: Transaction, id: string, endedAt: Date) =>
  tx.update(benchSessions).set({ endedAt }).where(eq(benchSessions.id, id));
