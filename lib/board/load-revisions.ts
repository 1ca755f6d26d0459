import { desc, eq } from "drizzle-orm";
import { database } from "@/db/client";
import { findBoard } from "@/db/queries/boards";
import { revisions } from "@/db/schema/boards";
import type { ProjectScope } from "@/lib/access/scope";

/** What a unit of the board can be made from. */
export type RevisionChoice = { id: string; letter: string; releasedAt: string | null };

export async function loadRevisions(scope: ProjectScope, boardId: string): Promise<RevisionChoice[]> {
  const board = await findBoard(database(), scope, boardId);
  if (!board) return [];
  const rows = await database()
    .select({ id: revisions.id, letter: revisions.letter, releasedAt: revisions.releasedAt })
    .from(revisions)
    .where(eq(revisions.boardId, board.id))
    .orderBy(desc(revisions.createdAt));
  return rows.map((row) => ({ ...row, releasedAt: row.releasedAt?.toISOString() ?? null }));
}
