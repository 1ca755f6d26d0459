import { and, asc, eq, inArray, isNull } from "drizzle-orm";
import type { Queryable } from "@/db/client";
import { units } from "@/db/schema/boards";
import { attachments, logEntries } from "@/db/schema/evidence";
import { users } from "@/db/schema/people";
import { evidenceColumns } from "./attachments";

type InProject = { projectId: string };

/** The row stays locked until the transaction ends: two people saving one entry come one after the other. */
export async function lockLogEntry(db: Queryable, scope: InProject, entryId: string) {
  const [row] = await db
    .select()
    .from(logEntries)
    .where(and(eq(logEntries.projectId, scope.projectId), eq(logEntries.id, entryId)))
    .for("update");
  return row;
}

const entryColumns = {
  id: logEntries.id,
  title: logEntries.title,
  body: logEntries.body,
  version: logEntries.version,
  authorId: logEntries.authorId,
  authorName: users.name,
  serial: units.serial,
  createdAt: logEntries.createdAt,
  editedAt: logEntries.editedAt,
  archivedAt: logEntries.archivedAt,
};

export async function findLogEntries(db: Queryable, scope: InProject, ids: string[]) {
  if (ids.length === 0) return [];
  return db
    .select(entryColumns)
    .from(logEntries)
    .leftJoin(users, eq(users.id, logEntries.authorId))
    .leftJoin(units, eq(units.id, logEntries.unitId))
    .where(and(eq(logEntries.projectId, scope.projectId), inArray(logEntries.id, ids)));
}

/** The pictures of some entries, each entry's in their order. */
export async function findEntryPictures(db: Queryable, scope: InProject, entryIds: string[]) {
  if (entryIds.length === 0) return [];
  return db
    .select({ ...evidenceColumns, logEntryId: attachments.logEntryId })
    .from(attachments)
    .leftJoin(users, eq(users.id, attachments.uploadedBy))
    .where(
      and(
        eq(attachments.projectId, scope.projectId),
        inArray(attachments.logEntryId, entryIds),
        isNull(attachments.archivedAt),
      ),
    )
    .orderBy(asc(attachments.position), asc(attachments.createdAt));
}
