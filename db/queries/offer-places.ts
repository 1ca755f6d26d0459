import { and, asc, eq, isNull, sql } from "drizzle-orm";
import type { Queryable } from "@/db/client";
import { boards } from "@/db/schema/boards";
import { procedureChecks, procedures, type Stage } from "@/db/schema/procedures";

type InProject = { projectId: string };
type Wanted = { stage?: Stage; kind: string; board?: string };

/** Per board in work its draft, or without one its newest issued procedure, with the checks of one kind, of one stage or of all. */
export async function findOfferPlaces(db: Queryable, scope: InProject, { stage, kind, board }: Wanted) {
  const current = db
    .selectDistinctOn([procedures.boardId], {
      id: procedures.id,
      boardId: procedures.boardId,
      number: procedures.number,
      state: procedures.state,
      version: procedures.version,
    })
    .from(procedures)
    .innerJoin(boards, eq(boards.id, procedures.boardId))
    .where(eq(boards.projectId, scope.projectId))
    .orderBy(procedures.boardId, sql`${procedures.state} = 'draft' desc`, sql`${procedures.number} desc`)
    .as("current");
  return db
    .select({
      board: boards.code,
      name: boards.name,
      number: current.number,
      state: current.state,
      version: current.version,
      check: procedureChecks,
    })
    .from(boards)
    .leftJoin(current, eq(current.boardId, boards.id))
    .leftJoin(
      procedureChecks,
      and(
        eq(procedureChecks.procedureId, current.id),
        stage && eq(procedureChecks.stage, stage),
        eq(procedureChecks.kind, kind),
      ),
    )
    .where(
      and(
        eq(boards.projectId, scope.projectId),
        isNull(boards.archivedAt),
        board === undefined ? undefined : eq(boards.code, board),
      ),
    )
    .orderBy(asc(boards.createdAt), asc(boards.code), asc(procedureChecks.position));
}
