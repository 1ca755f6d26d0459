import { eq } from "drizzle-orm";
import { lockLogEntry } from "@/db/queries/log-entries";
import { logEntries } from "@/db/schema/evidence";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { placePictures } from "./place-pictures";
import type { EditEntryInput } from "./schema";
import { unitIdOf } from "./write-log-entry";

export async function editLogEntry(
  scope: ProjectScope,
  input: EditEntryInput,
): Promise<Answer<{ id: string; version: number }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "edit-log-entry" }, async (tx) => {
    const current = await lockLogEntry(tx, scope, input.entryId);
    if (!current) return reject("not-found", "There is no such entry in this project.");
    if (current.archivedAt)
      reject("conflict", "The entry is archived. Restore it first; what you typed is still here.");
    if (current.version !== input.version) {
      const { title, body, version } = current;
      reject("conflict", "Somebody saved this entry meanwhile. What you typed is still here; look at both.", {
        details: { current: { title, body, version } },
      });
    }
    const unitId = await unitIdOf(tx, scope, input.unit);
    const { title, body } = input;
    const version = current.version + 1;
    await tx
      .update(logEntries)
      .set({ title, body, unitId, version, editedAt: new Date() })
      .where(eq(logEntries.id, current.id));
    await placePictures(tx, scope, { id: current.id, unitId }, input.pictures);
    const subject = { projectId, actorId: viewer.userId, subjectId: current.id, ...(unitId ? { unitId } : {}) };
    await recordEvent(tx, subject, "log.edited", { title });
    return { id: current.id, version };
  });
}
