import { and, eq, inArray, isNull } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import { findCheck, findOwnInstrument } from "@/db/queries/checks";
import { attachments, type AttachmentKind } from "@/db/schema/evidence";
import type { ProjectScope } from "@/lib/access/scope";
import { reject } from "@/lib/actions/answer";
import { insist, NO_SUCH_CHECK } from "@/lib/check/lock-check";
import type { RecordAttemptInput } from "./schema";

/** What an attempt is judged with, all of it the server's own: check, instrument, evidence. */
export async function loadRecording(tx: Transaction, scope: ProjectScope, input: RecordAttemptInput) {
  const found = await findCheck(tx, scope.projectId, input.checkId);
  const check = found ? insist(found) : reject("not-found", NO_SUCH_CHECK);
  const instrument =
    input.instrumentId === null ? undefined : await findOwnInstrument(tx, scope.viewer.userId, input.instrumentId);
  if (input.instrumentId !== null && !instrument) {
    const sentence = "The instrument is not among yours. Choose one of yours, or none.";
    return reject("invalid", sentence, { fields: { instrumentId: sentence } });
  }
  return { check, instrument, evidence: await findFreeEvidence(tx, scope, input) };
}

/** Files of this project that belong to nothing else yet: to this check or to no check, to no attempt, to no log entry. */
async function findFreeEvidence(
  tx: Transaction,
  scope: ProjectScope,
  input: RecordAttemptInput,
): Promise<AttachmentKind[]> {
  if (input.attachmentIds.length === 0) return [];
  const rows = await tx
    .select({ kind: attachments.kind, checkId: attachments.checkId })
    .from(attachments)
    .where(
      and(
        eq(attachments.projectId, scope.projectId),
        inArray(attachments.id, input.attachmentIds),
        isNull(attachments.attemptId),
        isNull(attachments.logEntryId),
        isNull(attachments.faultId),
        isNull(attachments.reworkId),
        isNull(attachments.archivedAt),
      ),
    )
    .orderBy(attachments.id)
    .for("update");
  const free = rows.filter((row) => row.checkId === null || row.checkId === input.checkId);
  if (free.length < input.attachmentIds.length) {
    const sentence = "A file is missing, was removed or belongs to something else. Add it again; nothing was recorded.";
    reject("invalid", sentence, { fields: { attachmentIds: sentence } });
  }
  return free.map((row) => row.kind);
}
