import { and, asc, eq, isNull, sql } from "drizzle-orm";
import type { Queryable, Transaction } from "@/db/client";
import { boards, units } from "@/db/schema/boards";
import { blockChildren, blocks, boardBlocks } from "@/db/schema/parts";

type InProject = { projectId: string };

/** Two changes at once could close a circle that neither sees: blocks of one project change one after another. */
const BLOCKS = 4120;

export async function lockBlocks(tx: Transaction, { projectId }: InProject): Promise<void> {
  await tx.execute(sql`select pg_advisory_xact_lock(${BLOCKS}, hashtext(${projectId}))`);
}

/** Every block, archived ones too, by name. */
export async function findBlocks(db: Queryable, scope: InProject) {
  return db.select().from(blocks).where(eq(blocks.projectId, scope.projectId)).orderBy(asc(blocks.name));
}

export async function findBlockChildren(db: Queryable, scope: InProject) {
  return db
    .select({ blockId: blockChildren.blockId, childId: blockChildren.childId, count: blockChildren.count })
    .from(blockChildren)
    .innerJoin(blocks, eq(blocks.id, blockChildren.blockId))
    .where(eq(blocks.projectId, scope.projectId));
}

/** Which blocks the boards in work use, and how often. */
export async function findBoardBlocks(db: Queryable, scope: InProject) {
  return db
    .select({ boardId: boardBlocks.boardId, blockId: boardBlocks.blockId, count: boardBlocks.count })
    .from(boardBlocks)
    .innerJoin(boards, eq(boards.id, boardBlocks.boardId))
    .where(and(eq(boards.projectId, scope.projectId), isNull(boards.archivedAt)));
}

/** Boards in work, cards and backplane, the oldest first. */
export async function findBoardsInWork(db: Queryable, scope: InProject) {
  return db
    .select({ id: boards.id, code: boards.code, name: boards.name, kind: boards.kind })
    .from(boards)
    .where(and(eq(boards.projectId, scope.projectId), isNull(boards.archivedAt)))
    .orderBy(asc(boards.createdAt), asc(boards.code));
}

/** Units in work with the time from which they are there. */
export async function findBuiltUnits(db: Queryable, scope: InProject) {
  return db
    .select({ boardId: units.boardId, serial: units.serial, createdAt: units.createdAt })
    .from(units)
    .where(and(eq(units.projectId, scope.projectId), isNull(units.archivedAt)))
    .orderBy(asc(units.serial));
}
