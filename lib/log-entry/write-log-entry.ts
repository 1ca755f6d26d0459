import type { Transaction } from "@/db/client";
import { findUnitBySerial } from "@/db/queries/units";
import { logEntries } from "@/db/schema/evidence";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { placePictures } from "./place-pictures";
import type { WriteEntryInput } from "./schema";

export async function writeLogEntry(scope: ProjectScope, input: WriteEntryInput): Promise<Answer<{ id: string }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "write-log-entry" }, async (tx) => {
    const id = crypto.randomUUID();
    const unitId = await unitIdOf(tx, scope, input.unit);
    const { title, body } = input;
    await tx.insert(logEntries).values({ id, projectId, unitId, authorId: viewer.userId, title, body });
    await placePictures(tx, scope, { id, unitId }, input.pictures);
    const subject = { projectId, actorId: viewer.userId, subjectId: id, ...(unitId ? { unitId } : {}) };
    await recordEvent(tx, subject, "log.written", { title });
    return { id };
  });
}

/** The unit that an entry names by its serial. */
export async function unitIdOf(tx: Transaction, scope: ProjectScope, serial: string): Promise<string | null> {
  if (serial === "") return null;
  const unit = await findUnitBySerial(tx, scope, serial);
  const message = `There is no unit ${serial} in this project.`;
  return unit ? unit.id : reject("invalid", message, { fields: { unit: message } });
}
