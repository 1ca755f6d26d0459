import { and, asc, desc, eq, inArray, isNotNull, lt, sql } from "drizzle-orm";
import type { Queryable } from "@/db/client";
import { units } from "@/db/schema/boards";
import { events } from "@/db/schema/events";
import { attachments } from "@/db/schema/evidence";
import { users } from "@/db/schema/people";
import { procedureChecks } from "@/db/schema/procedures";
import { checks } from "@/db/schema/travelers";

type InProject = { projectId: string };
export type EventFilter = {
  kinds?: readonly string[] | undefined;
  onlyFailures?: boolean | undefined;
  /** Leaves out that a file was attached when it now stands in a log entry. */
  withoutEntryPictures?: boolean | undefined;
  /** Serial. */
  unit?: string | undefined;
  actorId?: string | undefined;
  /** What the event is about: a fault, an entry. */
  subjectId?: string | undefined;
  /** Events older than this one. */
  before?: number | undefined;
};

const notOfEntry = sql`not (${events.kind} = 'evidence.attached' and exists (
  select 1 from ${attachments} where ${attachments.id} = ${events.subjectId} and ${attachments.logEntryId} is not null))`;

/** Newest first, each with the names that its sentence needs. The order is the order of arrival. */
export async function findEvents(db: Queryable, scope: InProject, filter: EventFilter, limit: number) {
  return db
    .select({
      id: events.id,
      kind: events.kind,
      payload: events.payload,
      at: events.at,
      actorId: events.actorId,
      actorName: users.name,
      unitSerial: units.serial,
      checkId: events.checkId,
      checkTitle: procedureChecks.title,
      subjectId: events.subjectId,
    })
    .from(events)
    .leftJoin(users, eq(users.id, events.actorId))
    .leftJoin(units, eq(units.id, events.unitId))
    .leftJoin(checks, eq(checks.id, events.checkId))
    .leftJoin(procedureChecks, eq(procedureChecks.id, checks.procedureCheckId))
    .where(
      and(
        eq(events.projectId, scope.projectId),
        filter.kinds ? inArray(events.kind, [...filter.kinds]) : undefined,
        filter.onlyFailures ? sql`${events.payload} ->> 'verdict' = 'does-not-conform'` : undefined,
        filter.withoutEntryPictures ? notOfEntry : undefined,
        filter.unit === undefined ? undefined : eq(units.serial, filter.unit),
        filter.actorId === undefined ? undefined : eq(events.actorId, filter.actorId),
        filter.subjectId === undefined ? undefined : eq(events.subjectId, filter.subjectId),
        filter.before === undefined ? undefined : lt(events.id, filter.before),
      ),
    )
    .orderBy(desc(events.id))
    .limit(limit);
}

/** Everybody who ever did something in the project, also those who left. */
export async function findActors(db: Queryable, scope: InProject) {
  return db
    .selectDistinct({ id: users.id, name: users.name })
    .from(events)
    .innerJoin(users, eq(users.id, events.actorId))
    .where(and(eq(events.projectId, scope.projectId), isNotNull(events.actorId)))
    .orderBy(asc(users.name));
}
