import { and, eq } from "drizzle-orm";
import { database } from "@/db/client";
import { deleteSessions, listSessions } from "@/db/queries/sessions";
import { sessions } from "@/db/schema/people";
import type { OwnScope } from "@/lib/access/scope";
import { ok, refuse, type Answer } from "@/lib/actions/answer";
import { sessionKey } from "@/lib/auth/session-cookie";
import { browserOf } from "./browser-of";

export type SessionLine = { id: string; where: string; since: Date; isThis: boolean };

/** The list shows a hash of the key: nothing in the page opens or names a session to anybody else. */
export async function loadSessions(scope: OwnScope, thisKey: string | undefined): Promise<SessionLine[]> {
  const rows = await listSessions(database(), scope.viewer.userId);
  return rows.map((row) => ({
    id: sessionKey(row.sessionToken),
    where: browserOf(row.userAgent),
    since: row.createdAt,
    isThis: row.sessionToken === thisKey,
  }));
}

export async function endSession(scope: OwnScope, id: string): Promise<Answer<null>> {
  const rows = await listSessions(database(), scope.viewer.userId);
  const row = rows.find((one) => sessionKey(one.sessionToken) === id);
  if (!row) return refuse("not-found", "This session has ended already.");
  await database()
    .delete(sessions)
    .where(and(eq(sessions.sessionToken, row.sessionToken), eq(sessions.userId, scope.viewer.userId)));
  return ok(null);
}

/** Everywhere, this session too. */
export async function endAllSessions(scope: OwnScope): Promise<Answer<{ ended: number }>> {
  return ok({ ended: await deleteSessions(database(), scope.viewer.userId) });
}
