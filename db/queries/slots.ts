import { and, eq, isNull } from "drizzle-orm";
import type { Queryable } from "@/db/client";
import { slotOccupancies, slots, units } from "@/db/schema/boards";

type InProject = { projectId: string };

/** The row stays locked until the transaction ends: a slot takes one unit at a time. */
export async function lockSlot(db: Queryable, scope: InProject, slotId: string) {
  const [row] = await db
    .select()
    .from(slots)
    .where(and(eq(slots.projectId, scope.projectId), eq(slots.id, slotId), isNull(slots.archivedAt)))
    .for("update");
  return row;
}

export async function findSlot(db: Queryable, scope: InProject, slotId: string) {
  const [row] = await db
    .select()
    .from(slots)
    .where(and(eq(slots.projectId, scope.projectId), eq(slots.id, slotId), isNull(slots.archivedAt)))
    .limit(1);
  return row;
}

export async function findSlotAt(db: Queryable, scope: InProject, position: number) {
  const [row] = await db
    .select({ id: slots.id })
    .from(slots)
    .where(and(eq(slots.projectId, scope.projectId), eq(slots.position, position), isNull(slots.archivedAt)))
    .limit(1);
  return row;
}

export async function findUnitInSlot(db: Queryable, slotId: string) {
  const [row] = await db
    .select({ occupancyId: slotOccupancies.id, id: units.id, serial: units.serial })
    .from(slotOccupancies)
    .innerJoin(units, eq(units.id, slotOccupancies.unitId))
    .where(and(eq(slotOccupancies.slotId, slotId), isNull(slotOccupancies.removedAt)))
    .limit(1);
  return row;
}

export async function findSlotOfUnit(db: Queryable, unitId: string) {
  const [row] = await db
    .select({ occupancyId: slotOccupancies.id, id: slots.id, position: slots.position })
    .from(slotOccupancies)
    .innerJoin(slots, eq(slots.id, slotOccupancies.slotId))
    .where(and(eq(slotOccupancies.unitId, unitId), isNull(slotOccupancies.removedAt)))
    .limit(1);
  return row;
}
