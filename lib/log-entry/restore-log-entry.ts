import { eq } from "drizzle-orm";
import { lockLogEntry } from "@/db/queries/log-entries";
import { logEntries } from "@/db/schema/evidence";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import type { EntryInput } from "./schema";

/** Brings an archived entry back to its place in the log. */
export async function restoreLogEntry(scope: ProjectScope, input: EntryInput): Promise<Answer<{ id: string }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "restore-log-entry" }, async (tx) => {
    const current = await lockLogEntry(tx, scope, input.entryId);
    if (!current) return reject("not-found", "There is no such entry in this project.");
    if (!current.archivedAt) return { id: current.id };
    await tx.update(logEntries).set({ archivedAt: null }).where(eq(logEntries.id, current.id));
    const unit = current.unitId ? { unitId: current.unitId } : {};
    const subject = { projectId, actorId: viewer.userId, subjectId: current.id, ...unit };
    await recordEvent(tx, subject, "log.restored", { title: current.title });
    return { id: current.id };
  });
}
