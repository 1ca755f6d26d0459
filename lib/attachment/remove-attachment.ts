import { eq } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import { attachments } from "@/db/schema/evidence";
import { attemptVoids } from "@/db/schema/travelers";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { requireAttachment, subjectOf } from "./change-attachment";
import type { AttachmentInput } from "./schema";

/** Takes the file out of sight; restoreAttachment() brings it back. */
export async function removeAttachment(scope: ProjectScope, input: AttachmentInput): Promise<Answer<{ id: string }>> {
  const write = { writeId: input.writeId, userId: scope.viewer.userId, action: "remove-attachment" };
  return change(write, async (tx) => {
    const row = await requireAttachment(tx, scope, input.attachmentId);
    if (row.archivedAt) return { id: row.id };
    if (row.attemptId) await requireVoided(tx, row.attemptId);
    await tx.update(attachments).set({ archivedAt: new Date() }).where(eq(attachments.id, row.id));
    await recordEvent(tx, subjectOf(scope, row), "evidence.removed", { kind: row.kind, fileName: row.fileName });
    return { id: row.id };
  });
}

/** An attempt is never changed, and so its evidence stays as long as the attempt counts. */
async function requireVoided(tx: Transaction, attemptId: string): Promise<void> {
  const [voided] = await tx.select().from(attemptVoids).where(eq(attemptVoids.attemptId, attemptId)).limit(1);
  if (!voided)
    reject("conflict", "The file is evidence of a recorded attempt and stays with it. Void the attempt first.");
}
