import { and, asc, eq, gte, isNull, lt, sql } from "drizzle-orm";
import type { Queryable } from "@/db/client";
import { boards, units } from "@/db/schema/boards";
import { events } from "@/db/schema/events";
import { attachments, logEntries } from "@/db/schema/evidence";
import { users } from "@/db/schema/people";
import { procedureChecks } from "@/db/schema/procedures";
import { projects } from "@/db/schema/projects";
import { attempts, checks } from "@/db/schema/travelers";

type InProject = { projectId: string };
type Span = { since: Date; until: Date };

/** What happened in the span, oldest first, with the names that its sentences need. */
export async function findEventsBetween(
  db: Queryable,
  { projectId }: InProject,
  { since, until }: Span,
  limit: number,
) {
  return db
    .select({
      id: events.id,
      kind: events.kind,
      payload: events.payload,
      at: events.at,
      actorName: users.name,
      unitSerial: units.serial,
      checkId: events.checkId,
      checkTitle: procedureChecks.title,
      subjectId: events.subjectId,
      note: attempts.note,
      state: checks.state,
    })
    .from(events)
    .leftJoin(users, eq(users.id, events.actorId))
    .leftJoin(units, eq(units.id, events.unitId))
    .leftJoin(checks, eq(checks.id, events.checkId))
    .leftJoin(attempts, eq(attempts.id, events.subjectId))
    .leftJoin(procedureChecks, eq(procedureChecks.id, checks.procedureCheckId))
    .where(and(eq(events.projectId, projectId), gte(events.at, since), lt(events.at, until)))
    .orderBy(asc(events.id))
    .limit(limit);
}

export type DigestEvent = Awaited<ReturnType<typeof findEventsBetween>>[number];

/** Log entries written in the span, each with its pictures in their order, one row a picture. */
export async function findEntriesBetween(db: Queryable, { projectId }: InProject, { since, until }: Span) {
  return db
    .select({
      id: logEntries.id,
      title: logEntries.title,
      body: logEntries.body,
      author: users.name,
      createdAt: logEntries.createdAt,
      picture: {
        id: attachments.id,
        caption: attachments.caption,
        fileName: attachments.fileName,
        smallKey: attachments.smallKey,
        objectKey: attachments.objectKey,
      },
    })
    .from(logEntries)
    .leftJoin(users, eq(users.id, logEntries.authorId))
    .leftJoin(
      attachments,
      and(
        eq(attachments.logEntryId, logEntries.id),
        isNull(attachments.archivedAt),
        sql`${attachments.kind} <> 'scope-data'`,
      ),
    )
    .where(
      and(
        eq(logEntries.projectId, projectId),
        isNull(logEntries.archivedAt),
        gte(logEntries.createdAt, since),
        lt(logEntries.createdAt, until),
      ),
    )
    .orderBy(asc(logEntries.createdAt), asc(attachments.position), asc(attachments.createdAt));
}

/** Checks that fail now, the longest first, with what was recorded last. */
export async function findOpenFailures(db: Queryable, { projectId }: InProject) {
  return db
    .select({
      checkId: checks.id,
      serial: units.serial,
      title: procedureChecks.title,
      since: checks.stateSince,
      payload: events.payload,
      note: attempts.note,
    })
    .from(checks)
    .innerJoin(units, and(eq(units.id, checks.unitId), isNull(units.archivedAt)))
    .innerJoin(boards, and(eq(boards.id, units.boardId), isNull(boards.archivedAt)))
    .innerJoin(procedureChecks, eq(procedureChecks.id, checks.procedureCheckId))
    .leftJoin(events, and(eq(events.subjectId, checks.lastAttemptId), eq(events.kind, "attempt.recorded")))
    .leftJoin(attempts, eq(attempts.id, checks.lastAttemptId))
    .where(and(eq(checks.projectId, projectId), eq(checks.state, "failed"), isNull(checks.retiredAt)))
    .orderBy(asc(checks.stateSince));
}

export async function findProjectToMail(db: Queryable, { projectId }: InProject) {
  const [row] = await db
    .select({ id: projects.id, slug: projects.slug, name: projects.name })
    .from(projects)
    .where(eq(projects.id, projectId));
  return row;
}
