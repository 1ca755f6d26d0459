import { and, eq, isNull } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import { slotOccupancies } from "@/db/schema/boards";
import { findSlotOfUnit } from "@/db/queries/slots";
import type { ProjectScope } from "@/lib/access/scope";
import { recordEvent } from "@/lib/event/record-event";

/** Takes the unit out of its slot, if it sits in one, and closes that line of the slot's history. */
export async function vacate(tx: Transaction, scope: ProjectScope, unit: { id: string; serial: string }) {
  const slot = await findSlotOfUnit(tx, unit.id);
  if (!slot) return undefined;
  const actorId = scope.viewer.userId;
  await tx
    .update(slotOccupancies)
    .set({ removedAt: new Date(), removedBy: actorId })
    .where(and(eq(slotOccupancies.id, slot.occupancyId), isNull(slotOccupancies.removedAt)));
  await recordEvent(tx, { projectId: scope.projectId, actorId, unitId: unit.id, subjectId: slot.id }, "unit.removed", {
    serial: unit.serial,
    position: slot.position,
  });
  return slot;
}
