import { eq } from "drizzle-orm";
import { findUnitInSlot, lockSlot } from "@/db/queries/slots";
import { slots } from "@/db/schema/boards";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { refreshFindings } from "@/lib/machine/refresh-findings";
import type { ChangeSlotInput } from "./schema";

/** The slot leaves the drawing; which units sat in it stays on their history. */
export async function archiveSlot(scope: ProjectScope, input: ChangeSlotInput): Promise<Answer<{ position: number }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "archive-slot" }, async (tx) => {
    const slot = await lockSlot(tx, scope, input.slotId);
    if (!slot) return reject("not-found", "There is no such slot in this project.");
    const sitting = await findUnitInSlot(tx, slot.id);
    if (sitting) reject("conflict", `${sitting.serial} sits in slot ${slot.position}. Take it out first.`);
    await tx.update(slots).set({ archivedAt: new Date() }).where(eq(slots.id, slot.id));
    const subject = { projectId, actorId: viewer.userId, subjectId: slot.id };
    await recordEvent(tx, subject, "slot.archived", { position: slot.position });
    await refreshFindings(tx, scope);
    return { position: slot.position };
  });
}
