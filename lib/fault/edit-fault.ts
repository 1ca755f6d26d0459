import { eq } from "drizzle-orm";
import { lockFault } from "@/db/queries/faults";
import { faults } from "@/db/schema/faults";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { isClosed, STATE_WORDS } from "./fault-words";
import type { EditFaultInput, FaultFields } from "./schema";

/** Parts of the record as the log names them. */
const PARTS: Record<keyof Omit<FaultFields, "state">, string> = {
  title: "title",
  symptom: "symptom",
  suspected: "what is suspected",
  tried: "what was tried",
  cause: "cause",
  mend: "mend",
  lesson: "lesson",
  nextRevision: "what the next revision should change",
  hours: "hours",
  signals: "signals",
  pins: "pins",
};

export async function editFault(
  scope: ProjectScope,
  input: EditFaultInput,
): Promise<Answer<{ number: number; version: number }>> {
  const { projectId, viewer } = scope;
  const { project: _project, writeId, faultId, version: seen, ...fields } = input;
  return change({ writeId, userId: viewer.userId, action: "edit-fault" }, async (tx) => {
    const current = await lockFault(tx, scope, faultId);
    if (!current) return reject("not-found", "There is no such fault in this project.");
    if (current.version !== seen) {
      const { title, symptom, suspected, tried, cause, mend, lesson, nextRevision, state, version } = current;
      reject("conflict", "Somebody wrote on this fault meanwhile. What you typed is still here; look at both.", {
        details: { current: { title, symptom, suspected, tried, cause, mend, lesson, nextRevision, state, version } },
      });
    }
    const { number, unitId } = current;
    const version = current.version + 1;
    const wasClosed = isClosed(current.state);
    const closedAt = isClosed(fields.state) ? (wasClosed ? current.closedAt : new Date()) : null;
    await tx
      .update(faults)
      .set({ ...fields, version, closedAt })
      .where(eq(faults.id, faultId));
    const subject = { projectId, actorId: viewer.userId, unitId, subjectId: faultId };
    const what = changedParts(current, fields);
    const { title } = fields;
    if (what.length > 0) await recordEvent(tx, subject, "fault.edited", { number, title, what: what.join(", ") });
    if (current.state !== fields.state) {
      const [from, to] = [STATE_WORDS[current.state], STATE_WORDS[fields.state]];
      await recordEvent(tx, subject, "fault.stated", { number, title, from, to });
    }
    return { number, version };
  });
}

function changedParts(before: typeof faults.$inferSelect, after: FaultFields): string[] {
  return Object.entries(PARTS).flatMap(([key, word]) => {
    // Entries of the record above, whose keys the compiler widens to text.
    const part = key as keyof typeof PARTS;
    return JSON.stringify(before[part]) === JSON.stringify(after[part]) ? [] : [word];
  });
}
