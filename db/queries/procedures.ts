import { and, asc, desc, eq, max, ne } from "drizzle-orm";
import type { Queryable, Transaction } from "@/db/client";
import { boards } from "@/db/schema/boards";
import { procedureChecks, procedures } from "@/db/schema/procedures";

type InProject = { projectId: string };

const ofBoard = (scope: InProject, code: string) => and(eq(boards.projectId, scope.projectId), eq(boards.code, code));

/** The draft with its board, both locked: changes of one draft come one after another. */
export async function lockDraft(tx: Transaction, scope: InProject, code: string) {
  const [row] = await tx
    .select({ procedure: procedures, board: boards })
    .from(procedures)
    .innerJoin(boards, eq(boards.id, procedures.boardId))
    .where(and(ofBoard(scope, code), eq(procedures.state, "draft")))
    .for("update");
  return row;
}

/** All versions of a board, newest first. */
export async function findProcedures(db: Queryable, scope: InProject, code: string) {
  return db
    .select({ procedure: procedures })
    .from(procedures)
    .innerJoin(boards, eq(boards.id, procedures.boardId))
    .where(ofBoard(scope, code))
    .orderBy(desc(procedures.number))
    .then((rows) => rows.map((row) => row.procedure));
}

/** The highest number given so far; a draft that was thrown away leaves no gap, since it never had one that counted. */
export async function highestNumber(db: Queryable, boardId: string): Promise<number> {
  const [row] = await db
    .select({ number: max(procedures.number) })
    .from(procedures)
    .where(and(eq(procedures.boardId, boardId), ne(procedures.state, "draft")));
  return row?.number ?? 0;
}

/** Ids come from a procedure that was found through its project. */
export async function findChecksOf(db: Queryable, procedureId: string) {
  return db
    .select()
    .from(procedureChecks)
    .where(eq(procedureChecks.procedureId, procedureId))
    .orderBy(asc(procedureChecks.position));
}
