import { and, asc, eq, isNull } from "drizzle-orm";
import { database } from "@/db/client";
import { boards, units } from "@/db/schema/boards";
import type { ProjectScope } from "@/lib/access/scope";

export type UnitChoice = { serial: string; board: string };

/** The units that an entry may be about. */
export async function loadEntryUnits(scope: ProjectScope): Promise<UnitChoice[]> {
  return database()
    .select({ serial: units.serial, board: boards.name })
    .from(units)
    .innerJoin(boards, eq(boards.id, units.boardId))
    .where(and(eq(units.projectId, scope.projectId), isNull(units.archivedAt)))
    .orderBy(asc(units.serial));
}
