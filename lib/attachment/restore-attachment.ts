import { eq } from "drizzle-orm";
import { attachments } from "@/db/schema/evidence";
import type { ProjectScope } from "@/lib/access/scope";
import type { Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { requireAttachment, subjectOf } from "./change-attachment";
import type { AttachmentInput } from "./schema";

export async function restoreAttachment(scope: ProjectScope, input: AttachmentInput): Promise<Answer<{ id: string }>> {
  const write = { writeId: input.writeId, userId: scope.viewer.userId, action: "restore-attachment" };
  return change(write, async (tx) => {
    const row = await requireAttachment(tx, scope, input.attachmentId);
    if (!row.archivedAt) return { id: row.id };
    await tx.update(attachments).set({ archivedAt: null }).where(eq(attachments.id, row.id));
    await recordEvent(tx, subjectOf(scope, row), "evidence.restored", { kind: row.kind, fileName: row.fileName });
    return { id: row.id };
  });
}
