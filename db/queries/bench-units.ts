import { and, asc, eq, isNull } from "drizzle-orm";
import type { Queryable } from "@/db/client";
import { boards, revisions, slotOccupancies, slots, units } from "@/db/schema/boards";
import { checks } from "@/db/schema/travelers";

/** Units in use with the state of each live check, in slot order, then by serial; a unit without traveler has one row. */
export async function findBenchUnits(db: Queryable, projectId: string) {
  return db
    .select({
      serial: units.serial,
      board: boards.name,
      letter: revisions.letter,
      slot: slots.position,
      stage: checks.stage,
      state: checks.state,
    })
    .from(units)
    .innerJoin(boards, eq(boards.id, units.boardId))
    .innerJoin(revisions, eq(revisions.id, units.revisionId))
    .leftJoin(slotOccupancies, and(eq(slotOccupancies.unitId, units.id), isNull(slotOccupancies.removedAt)))
    .leftJoin(slots, eq(slots.id, slotOccupancies.slotId))
    .leftJoin(checks, and(eq(checks.unitId, units.id), isNull(checks.retiredAt)))
    .where(and(eq(units.projectId, projectId), isNull(units.archivedAt), isNull(boards.archivedAt)))
    .orderBy(asc(slots.position), asc(units.serial), asc(checks.position));
}
