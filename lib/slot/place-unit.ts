import { findBoard } from "@/db/queries/boards";
import { findSlotOfUnit, findUnitInSlot, lockSlot } from "@/db/queries/slots";
import { lockUnit } from "@/db/queries/units";
import { slotOccupancies } from "@/db/schema/boards";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { refreshFindings } from "@/lib/machine/refresh-findings";
import type { PlaceUnitInput } from "./schema";

type Placed = { serial: string; position: number };

/**
 * Puts a unit into a slot. Both rows are locked, unit first, so of two people who place the same unit (or fill the same
 * slot) at once the second is told what the first did.
 */
export async function placeUnit(scope: ProjectScope, input: PlaceUnitInput): Promise<Answer<Placed>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "place-unit" }, async (tx) => {
    const unit = await lockUnit(tx, scope, input.unitId);
    if (!unit || unit.archivedAt) return reject("not-found", "There is no such unit in this project.");
    const slot = await lockSlot(tx, scope, input.slotId);
    if (!slot) return reject("not-found", "There is no such slot in this project.");
    const placed = { serial: unit.serial, position: slot.position };
    const seat = await findSlotOfUnit(tx, unit.id);
    if (seat?.id === slot.id) return placed;
    if (seat) reject("conflict", `${unit.serial} sits in slot ${seat.position}. Take it out there first.`);
    const sitting = await findUnitInSlot(tx, slot.id);
    if (sitting) reject("conflict", `${sitting.serial} sits in slot ${slot.position} already. Take it out first.`);
    const board = await findBoard(tx, scope, unit.boardId);
    if (board?.kind === "backplane")
      reject("invalid", `${unit.serial} is a backplane. It carries the slots and goes into none.`);
    if (slot.boardId && slot.boardId !== unit.boardId) {
      const wanted = await findBoard(tx, scope, slot.boardId);
      reject(
        "invalid",
        `Slot ${slot.position} is wired for ${wanted?.name ?? "another board"}. ${unit.serial} would not fit it.`,
      );
    }
    await tx.insert(slotOccupancies).values({ slotId: slot.id, unitId: unit.id, placedBy: viewer.userId });
    const subject = { projectId, actorId: viewer.userId, unitId: unit.id, subjectId: slot.id };
    await recordEvent(tx, subject, "unit.placed", placed);
    await refreshFindings(tx, scope);
    return placed;
  });
}
