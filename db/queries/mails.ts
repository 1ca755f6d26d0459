import { and, desc, eq, isNull, lte, sql } from "drizzle-orm";
import type { Queryable } from "@/db/client";
import { units } from "@/db/schema/boards";
import { events } from "@/db/schema/events";
import { accountTokens, users } from "@/db/schema/people";
import { procedureChecks } from "@/db/schema/procedures";
import { invitations, memberships, projects } from "@/db/schema/projects";
import { attemptVoids, attempts, checks, reopenings } from "@/db/schema/travelers";

/** A link of the account that still works, with its person. */
export async function findOpenAccountToken(db: Queryable, id: string) {
  const [row] = await db
    .select({ token: accountTokens, name: users.name, email: users.email })
    .from(accountTokens)
    .innerJoin(users, eq(users.id, accountTokens.userId))
    .where(and(eq(accountTokens.id, id), isNull(accountTokens.usedAt), sql`${accountTokens.expiresAt} > now()`));
  return row;
}

/** An invitation that still works, with its project and who invited. */
export async function findInvitationToMail(db: Queryable, id: string) {
  const [row] = await db
    .select({
      email: invitations.email,
      role: invitations.role,
      expiresAt: invitations.expiresAt,
      inviter: users.name,
      project: { name: projects.name, summary: projects.summary, timeZone: projects.timeZone },
    })
    .from(invitations)
    .innerJoin(projects, and(eq(projects.id, invitations.projectId), isNull(projects.archivedAt)))
    .leftJoin(users, eq(users.id, invitations.invitedBy))
    .where(
      and(
        eq(invitations.id, id),
        isNull(invitations.acceptedAt),
        isNull(invitations.withdrawnAt),
        sql`${invitations.expiresAt} > now()`,
      ),
    );
  return row;
}

/** A reopening that nobody has answered yet, with its check. */
export async function findOpenReopening(db: Queryable, id: string) {
  const [row] = await db
    .select({
      reason: reopenings.reason,
      afterArrival: reopenings.afterArrival,
      by: users.name,
      checkId: checks.id,
      title: procedureChecks.title,
      serial: units.serial,
      project: { id: projects.id, slug: projects.slug, name: projects.name },
    })
    .from(reopenings)
    .innerJoin(checks, and(eq(checks.id, reopenings.checkId), isNull(checks.retiredAt)))
    .innerJoin(procedureChecks, eq(procedureChecks.id, checks.procedureCheckId))
    .innerJoin(units, eq(units.id, checks.unitId))
    .innerJoin(projects, and(eq(projects.id, checks.projectId), isNull(projects.archivedAt)))
    .leftJoin(users, eq(users.id, reopenings.userId))
    .where(
      and(
        eq(reopenings.id, id),
        sql`not exists (select 1 from ${attempts} where ${attempts.checkId} = ${checks.id}
          and ${attempts.arrival} > ${reopenings.afterArrival})`,
      ),
    );
  return row;
}

/** Who carried the check out last before it was reopened, when they are to be told, and the event of that attempt. */
export async function findPersonToTell(
  db: Queryable,
  reopening: { checkId: string; afterArrival: number; project: { id: string } },
) {
  const [row] = await db
    .select({ name: users.name, email: users.email, wantsMail: wantsNotices, payload: events.payload })
    .from(attempts)
    .innerJoin(users, eq(users.id, attempts.userId))
    .innerJoin(memberships, and(eq(memberships.userId, users.id), eq(memberships.projectId, reopening.project.id)))
    .leftJoin(attemptVoids, eq(attemptVoids.attemptId, attempts.id))
    .leftJoin(events, and(eq(events.subjectId, attempts.id), eq(events.kind, "attempt.recorded")))
    .where(
      and(
        eq(attempts.checkId, reopening.checkId),
        lte(attempts.arrival, reopening.afterArrival),
        isNull(attemptVoids.id),
      ),
    )
    .orderBy(desc(attempts.arrival))
    .limit(1);
  return row?.wantsMail ? row : undefined;
}

const wantsNotices = sql<boolean>`${users.mailOnReopen} and ${users.mailBouncedAt} is null
  and ${users.emailVerified} is not null`;

/** The address was refused for good: nothing but account mail goes there until it is confirmed again. */
export async function noteBounce(db: Queryable, email: string): Promise<void> {
  await db
    .update(users)
    .set({ mailBouncedAt: sql`now()` })
    .where(and(eq(users.email, email), isNull(users.mailBouncedAt)));
}
