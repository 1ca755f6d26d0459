import { lockAttachment, type AttachmentRow } from "@/db/queries/attachments";
import type { Transaction } from "@/db/client";
import type { ProjectScope } from "@/lib/access/scope";
import { reject } from "@/lib/actions/answer";

/** The file of a change, locked, or the refusal that it is not of this project. */
export async function requireAttachment(tx: Transaction, scope: ProjectScope, id: string): Promise<AttachmentRow> {
  const row = await lockAttachment(tx, scope, id);
  return row ?? reject("not-found", "There is no such file in this project.");
}

/** Whom the event of a change of this file concerns. */
export function subjectOf(scope: ProjectScope, row: AttachmentRow) {
  return {
    projectId: scope.projectId,
    actorId: scope.viewer.userId,
    subjectId: row.id,
    ...(row.unitId ? { unitId: row.unitId } : {}),
    ...(row.checkId ? { checkId: row.checkId } : {}),
  };
}
