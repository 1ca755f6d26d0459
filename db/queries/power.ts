import { and, asc, eq, isNull } from "drizzle-orm";
import type { Queryable } from "@/db/client";
import { boards } from "@/db/schema/boards";
import { powerLines } from "@/db/schema/power";

type InProject = { projectId: string };

/** Lines of all boards in work, in their order. */
export async function findPowerLines(db: Queryable, scope: InProject) {
  return db
    .select({
      id: powerLines.id,
      boardId: powerLines.boardId,
      board: boards.code,
      position: powerLines.position,
      item: powerLines.item,
    })
    .from(powerLines)
    .innerJoin(boards, eq(boards.id, powerLines.boardId))
    .where(and(eq(boards.projectId, scope.projectId), isNull(boards.archivedAt)))
    .orderBy(asc(powerLines.boardId), asc(powerLines.position));
}
