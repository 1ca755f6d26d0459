import { and, asc, eq } from "drizzle-orm";
import type { Queryable } from "@/db/client";
import { boards } from "@/db/schema/boards";
import { bomLines, parts } from "@/db/schema/parts";

type InProject = { projectId: string };

/** The project's own parts, archived ones too, by number. */
export async function findParts(db: Queryable, scope: InProject) {
  return db.select().from(parts).where(eq(parts.projectId, scope.projectId)).orderBy(asc(parts.number));
}

/** The row stays locked until the transaction ends: stock and price of a part change one after another. */
export async function lockPart(db: Queryable, scope: InProject, wanted: { id: string } | { number: string }) {
  const named = "id" in wanted ? eq(parts.id, wanted.id) : eq(parts.number, wanted.number);
  const [row] = await db
    .select()
    .from(parts)
    .where(and(eq(parts.projectId, scope.projectId), named))
    .for("update");
  return row;
}

/** What boards carry besides the packages of their blocks, in the order of each board's list. */
export async function findBomLines(db: Queryable, scope: InProject) {
  return db
    .select({
      boardId: bomLines.boardId,
      partNumber: bomLines.partNumber,
      description: bomLines.description,
      count: bomLines.count,
      designators: bomLines.designators,
    })
    .from(bomLines)
    .innerJoin(boards, eq(boards.id, bomLines.boardId))
    .where(eq(boards.projectId, scope.projectId))
    .orderBy(asc(bomLines.boardId), asc(bomLines.position));
}
