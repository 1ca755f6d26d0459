import { and, eq, isNotNull } from "drizzle-orm";
import { findSlotAt } from "@/db/queries/slots";
import { slots } from "@/db/schema/boards";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { refreshFindings } from "@/lib/machine/refresh-findings";
import type { ChangeSlotInput } from "./schema";

/** Undoes archiving, unless another slot has taken the position. */
export async function restoreSlot(scope: ProjectScope, input: ChangeSlotInput): Promise<Answer<{ position: number }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "restore-slot" }, async (tx) => {
    const inProject = and(eq(slots.id, input.slotId), eq(slots.projectId, projectId), isNotNull(slots.archivedAt));
    const [slot] = await tx.select().from(slots).where(inProject).for("update");
    if (!slot) return reject("not-found", "There is no such archived slot in this project.");
    if (await findSlotAt(tx, scope, slot.position)) {
      const { position } = slot;
      reject("conflict", `Another slot stands at position ${position} now. Give that one another position first.`);
    }
    await tx.update(slots).set({ archivedAt: null }).where(eq(slots.id, slot.id));
    const subject = { projectId, actorId: viewer.userId, subjectId: slot.id };
    await recordEvent(tx, subject, "slot.created", { position: slot.position });
    await refreshFindings(tx, scope);
    return { position: slot.position };
  });
}
