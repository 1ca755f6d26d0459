import { and, eq, getTableColumns } from "drizzle-orm";
import type { Queryable } from "@/db/client";
import { boards, revisions } from "@/db/schema/boards";
import { edgeColumns } from "./connectors";

/** What every query of a project needs; a ProjectScope is one. */
type InProject = { projectId: string };

const columns = { ...getTableColumns(boards), ...edgeColumns };

export async function findBoard(db: Queryable, scope: InProject, boardId: string) {
  const [row] = await db
    .select(columns)
    .from(boards)
    .where(and(eq(boards.projectId, scope.projectId), eq(boards.id, boardId)))
    .limit(1);
  return row;
}

/** The row stays locked until the transaction ends: changes of one board come one after another. */
export async function lockBoard(db: Queryable, scope: InProject, boardId: string) {
  const [row] = await db
    .select(columns)
    .from(boards)
    .where(and(eq(boards.projectId, scope.projectId), eq(boards.id, boardId)))
    .for("update");
  return row;
}

export async function findBoardByCode(db: Queryable, scope: InProject, code: string) {
  const [row] = await db
    .select(columns)
    .from(boards)
    .where(and(eq(boards.projectId, scope.projectId), eq(boards.code, code)))
    .limit(1);
  return row;
}

export async function findRevision(db: Queryable, scope: InProject, revisionId: string) {
  const [row] = await db
    .select({ revision: revisions, board: boards })
    .from(revisions)
    .innerJoin(boards, eq(boards.id, revisions.boardId))
    .where(and(eq(boards.projectId, scope.projectId), eq(revisions.id, revisionId)))
    .limit(1);
  return row;
}
