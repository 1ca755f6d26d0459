import { and, desc, eq, gt, ne, sql } from "drizzle-orm";
import type { Queryable } from "@/db/client";
import { sessions, users } from "@/db/schema/people";

/** The person of a session that has not run out. */
export async function findSessionUser(db: Queryable, sessionToken: string) {
  const [row] = await db
    .select({ user: users })
    .from(sessions)
    .innerJoin(users, eq(users.id, sessions.userId))
    .where(and(eq(sessions.sessionToken, sessionToken), gt(sessions.expires, sql`now()`)))
    .limit(1);
  return row?.user;
}

export function listSessions(db: Queryable, userId: string) {
  return db
    .select({
      sessionToken: sessions.sessionToken,
      userAgent: sessions.userAgent,
      createdAt: sessions.createdAt,
      expires: sessions.expires,
    })
    .from(sessions)
    .where(and(eq(sessions.userId, userId), gt(sessions.expires, sql`now()`)))
    .orderBy(desc(sessions.createdAt));
}

/** Signs a person out: everywhere, or everywhere but in one session. */
export async function deleteSessions(db: Queryable, userId: string, except?: string): Promise<number> {
  const others = except ? ne(sessions.sessionToken, except) : undefined;
  const gone = await db
    .delete(sessions)
    .where(and(eq(sessions.userId, userId), others))
    .returning({ userId: sessions.userId });
  return gone.length;
}
