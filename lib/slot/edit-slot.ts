import { eq } from "drizzle-orm";
import { findSlotAt, findUnitInSlot, lockSlot } from "@/db/queries/slots";
import { slots } from "@/db/schema/boards";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { refreshFindings } from "@/lib/machine/refresh-findings";
import { rejectTakenPosition, requireCard } from "./create-slot";
import type { EditSlotInput } from "./schema";

/** Position, label, pitch, and which board the slot is wired for. The board cannot change under a unit. */
export async function editSlot(scope: ProjectScope, input: EditSlotInput): Promise<Answer<{ version: number }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "edit-slot" }, async (tx) => {
    const current = await lockSlot(tx, scope, input.slotId);
    if (!current) return reject("not-found", "There is no such slot in this project.");
    if (current.version !== input.version) {
      const { position, label, pitchHp, boardId, version } = current;
      reject("conflict", "Somebody changed this slot meanwhile. Look at both and save again.", {
        details: { current: { position, label, pitchHp, boardId, version } },
      });
    }
    const { position, label, pitchHp, boardId } = input;
    if (boardId !== current.boardId) {
      const sitting = await findUnitInSlot(tx, current.id);
      if (sitting) {
        const sentence = `${sitting.serial} sits in this slot. Take it out before the slot gets another board.`;
        reject("conflict", sentence, { fields: { boardId: sentence } });
      }
      if (boardId) await requireCard(tx, scope, boardId);
    }
    if (position !== current.position && (await findSlotAt(tx, scope, position))) rejectTakenPosition(position);
    const version = current.version + 1;
    await tx.update(slots).set({ position, label, pitchHp, boardId, version }).where(eq(slots.id, current.id));
    await recordEvent(tx, { projectId, actorId: viewer.userId, subjectId: current.id }, "slot.edited", { position });
    await refreshFindings(tx, scope);
    return { version };
  });
}
