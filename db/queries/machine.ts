import { and, asc, eq, isNull, sql } from "drizzle-orm";
import type { Queryable } from "@/db/client";
import { boards, slotOccupancies, slots, units } from "@/db/schema/boards";
import { planConditions, rails } from "@/db/schema/power";
import { connectors, families, pins, signals } from "@/db/schema/wiring";

type InProject = { projectId: string };

/** Boards in work, the oldest first. */
export async function findMachineBoards(db: Queryable, scope: InProject) {
  return db
    .select({
      id: boards.id,
      code: boards.code,
      name: boards.name,
      kind: boards.kind,
      /** Serial of the only unit in work; null when there is none or more than one. */
      onlySerial: sql<string | null>`(select case when count(*) = 1 then max(u.serial) end from units u
        where u.board_id = boards.id and u.archived_at is null)`,
    })
    .from(boards)
    .where(and(eq(boards.projectId, scope.projectId), isNull(boards.archivedAt)))
    .orderBy(asc(boards.createdAt), asc(boards.code));
}

/** Slots in work with the serial of the unit that sits in them. */
export async function findMachineSlots(db: Queryable, scope: InProject) {
  return db
    .select({ id: slots.id, position: slots.position, boardId: slots.boardId, serial: units.serial })
    .from(slots)
    .leftJoin(slotOccupancies, and(eq(slotOccupancies.slotId, slots.id), isNull(slotOccupancies.removedAt)))
    .leftJoin(units, eq(units.id, slotOccupancies.unitId))
    .where(and(eq(slots.projectId, scope.projectId), isNull(slots.archivedAt)))
    .orderBy(asc(slots.position));
}

export async function findMachineConnectors(db: Queryable, scope: InProject) {
  return db
    .select()
    .from(connectors)
    .where(eq(connectors.projectId, scope.projectId))
    .orderBy(asc(connectors.boardId), asc(connectors.position));
}

export async function findMachinePins(db: Queryable, scope: InProject) {
  return db
    .select({
      connectorId: pins.connectorId,
      pin: pins.pin,
      signal: pins.signal,
      role: pins.role,
      family: pins.family,
      loads: pins.loads,
      enableGroup: pins.enableGroup,
      pullUpOhm: pins.pullUpOhm,
      note: pins.note,
    })
    .from(pins)
    .innerJoin(connectors, eq(connectors.id, pins.connectorId))
    .where(eq(connectors.projectId, scope.projectId));
}

export async function findSignals(db: Queryable, scope: InProject) {
  return db.select().from(signals).where(eq(signals.projectId, scope.projectId)).orderBy(asc(signals.name));
}

export async function findRails(db: Queryable, scope: InProject) {
  return db.select().from(rails).where(eq(rails.projectId, scope.projectId)).orderBy(asc(rails.position));
}

export async function findOwnFamilies(db: Queryable, scope: InProject) {
  return db.select().from(families).where(eq(families.projectId, scope.projectId)).orderBy(asc(families.name));
}

/** The project's conditions; the defaults of the table while nobody set them. */
export async function findConditions(db: Queryable, scope: InProject) {
  const [row] = await db.select().from(planConditions).where(eq(planConditions.projectId, scope.projectId));
  return (
    row ?? {
      projectId: scope.projectId,
      ambientC: 40,
      logicVolts: 5,
      logicRail: "+5V",
      pinCapacitancePf: 5,
      sparesPercent: 10,
      currency: "EUR",
      version: 0,
    }
  );
}
