import { and, asc, eq } from "drizzle-orm";
import type { Queryable } from "@/db/client";
import { boards } from "@/db/schema/boards";
import { delayPaths } from "@/db/schema/parts";

type InProject = { projectId: string };

/** All delay paths with the code of their board, archived ones too, by name. */
export async function findDelayPaths(db: Queryable, scope: InProject) {
  return db
    .select({ path: delayPaths, board: boards.code })
    .from(delayPaths)
    .leftJoin(boards, eq(boards.id, delayPaths.boardId))
    .where(eq(delayPaths.projectId, scope.projectId))
    .orderBy(asc(delayPaths.name));
}

/** The row stays locked until the transaction ends. */
export async function lockDelayPath(db: Queryable, scope: InProject, pathId: string) {
  const [row] = await db
    .select()
    .from(delayPaths)
    .where(and(eq(delayPaths.projectId, scope.projectId), eq(delayPaths.id, pathId)))
    .for("update");
  return row;
}
