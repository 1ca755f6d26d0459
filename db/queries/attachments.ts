import { and, asc, eq, isNull } from "drizzle-orm";
import type { Queryable } from "@/db/client";
import { units } from "@/db/schema/boards";
import { attachments, logEntries } from "@/db/schema/evidence";
import { faults, reworks } from "@/db/schema/faults";
import { users } from "@/db/schema/people";
import { procedureChecks } from "@/db/schema/procedures";
import { checks } from "@/db/schema/travelers";

type InProject = { projectId: string };
export type AttachmentRow = typeof attachments.$inferSelect;

export async function findAttachment(db: Queryable, scope: InProject, id: string): Promise<AttachmentRow | undefined> {
  const [row] = await db
    .select()
    .from(attachments)
    .where(and(eq(attachments.projectId, scope.projectId), eq(attachments.id, id)))
    .limit(1);
  return row;
}

/** The row stays locked until the transaction ends. */
export async function lockAttachment(db: Queryable, scope: InProject, id: string): Promise<AttachmentRow | undefined> {
  const [row] = await db
    .select()
    .from(attachments)
    .where(and(eq(attachments.projectId, scope.projectId), eq(attachments.id, id)))
    .for("update");
  return row;
}

export async function findAttachmentByUpload(db: Queryable, uploadId: string): Promise<AttachmentRow | undefined> {
  const [row] = await db.select().from(attachments).where(eq(attachments.uploadId, uploadId)).limit(1);
  return row;
}

/** What evidence shows, with the name of who sent it. */
export const evidenceColumns = {
  id: attachments.id,
  kind: attachments.kind,
  fileName: attachments.fileName,
  caption: attachments.caption,
  bytes: attachments.bytes,
  width: attachments.width,
  height: attachments.height,
  smallKey: attachments.smallKey,
  uploadedBy: attachments.uploadedBy,
  uploaderName: users.name,
  createdAt: attachments.createdAt,
};

export async function findEvidence(db: Queryable, scope: InProject, id: string) {
  const [row] = await db
    .select(evidenceColumns)
    .from(attachments)
    .leftJoin(users, eq(users.id, attachments.uploadedBy))
    .where(and(eq(attachments.projectId, scope.projectId), eq(attachments.id, id)))
    .limit(1);
  return row;
}

/** The check that a file is evidence of, only if it is of this project. */
export async function findTargetCheck(db: Queryable, scope: InProject, checkId: string) {
  const [row] = await db
    .select({ id: checks.id, unitId: checks.unitId, serial: units.serial, title: procedureChecks.title })
    .from(checks)
    .innerJoin(units, eq(units.id, checks.unitId))
    .innerJoin(procedureChecks, eq(procedureChecks.id, checks.procedureCheckId))
    .where(and(eq(checks.projectId, scope.projectId), eq(checks.id, checkId)))
    .limit(1);
  return row;
}

export async function findTargetEntry(db: Queryable, scope: InProject, logEntryId: string) {
  const [row] = await db
    .select({ id: logEntries.id, unitId: logEntries.unitId })
    .from(logEntries)
    .where(and(eq(logEntries.projectId, scope.projectId), eq(logEntries.id, logEntryId), isNull(logEntries.archivedAt)))
    .limit(1);
  return row;
}

export async function findTargetFault(db: Queryable, scope: InProject, faultId: string) {
  const [row] = await db
    .select({ id: faults.id, unitId: faults.unitId })
    .from(faults)
    .where(and(eq(faults.projectId, scope.projectId), eq(faults.id, faultId)))
    .limit(1);
  return row;
}

export async function findTargetRework(db: Queryable, scope: InProject, reworkId: string) {
  const [row] = await db
    .select({ id: reworks.id, unitId: reworks.unitId })
    .from(reworks)
    .where(and(eq(reworks.projectId, scope.projectId), eq(reworks.id, reworkId)))
    .limit(1);
  return row;
}

export async function findFaultEvidence(db: Queryable, scope: InProject, faultId: string) {
  return db
    .select(evidenceColumns)
    .from(attachments)
    .leftJoin(users, eq(users.id, attachments.uploadedBy))
    .where(
      and(eq(attachments.projectId, scope.projectId), eq(attachments.faultId, faultId), isNull(attachments.archivedAt)),
    )
    .orderBy(asc(attachments.createdAt));
}

/** Pictures of the reworks of one unit, each with its rework and side. */
export async function findReworkEvidence(db: Queryable, scope: InProject, unitId: string) {
  return db
    .select({ ...evidenceColumns, reworkId: attachments.reworkId, side: attachments.reworkSide })
    .from(attachments)
    .innerJoin(reworks, and(eq(reworks.id, attachments.reworkId), eq(reworks.unitId, unitId)))
    .leftJoin(users, eq(users.id, attachments.uploadedBy))
    .where(and(eq(attachments.projectId, scope.projectId), isNull(attachments.archivedAt)))
    .orderBy(asc(attachments.createdAt));
}
