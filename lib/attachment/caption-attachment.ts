import { eq } from "drizzle-orm";
import { attachments } from "@/db/schema/evidence";
import type { ProjectScope } from "@/lib/access/scope";
import type { Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { requireAttachment, subjectOf } from "./change-attachment";
import type { CaptionInput } from "./schema";

export async function captionAttachment(
  scope: ProjectScope,
  input: CaptionInput,
): Promise<Answer<{ caption: string }>> {
  const write = { writeId: input.writeId, userId: scope.viewer.userId, action: "caption-attachment" };
  return change(write, async (tx) => {
    const row = await requireAttachment(tx, scope, input.attachmentId);
    const { caption } = input;
    if (caption === row.caption) return { caption };
    await tx.update(attachments).set({ caption }).where(eq(attachments.id, row.id));
    const payload = { kind: row.kind, fileName: row.fileName, caption };
    await recordEvent(tx, subjectOf(scope, row), "evidence.captioned", payload);
    return { caption };
  });
}
