import { and, desc, eq, max } from "drizzle-orm";
import type { Queryable } from "@/db/client";
import { boards, revisions } from "@/db/schema/boards";
import { netlists } from "@/db/schema/netlists";
import { users } from "@/db/schema/people";

type InProject = { projectId: string };

/** Versions of all revisions of a board without their points, the newest first. */
export async function findNetlists(db: Queryable, scope: InProject, boardId: string) {
  return db
    .select({
      id: netlists.id,
      revisionId: netlists.revisionId,
      letter: revisions.letter,
      number: netlists.number,
      source: netlists.source,
      fileName: netlists.fileName,
      nets: netlists.nets,
      points: netlists.points,
      passedOver: netlists.passedOver,
      by: users.name,
      createdAt: netlists.createdAt,
    })
    .from(netlists)
    .innerJoin(revisions, eq(revisions.id, netlists.revisionId))
    .leftJoin(users, eq(users.id, netlists.createdBy))
    .where(and(eq(netlists.projectId, scope.projectId), eq(revisions.boardId, boardId)))
    .orderBy(desc(revisions.createdAt), desc(netlists.number));
}

export async function findNetlist(db: Queryable, scope: InProject, id: string) {
  const [row] = await db
    .select({ netlist: netlists, letter: revisions.letter, board: { id: boards.id, code: boards.code } })
    .from(netlists)
    .innerJoin(revisions, eq(revisions.id, netlists.revisionId))
    .innerJoin(boards, eq(boards.id, revisions.boardId))
    .where(and(eq(netlists.projectId, scope.projectId), eq(netlists.id, id)));
  return row;
}

/** Call it with the board's row locked: two people then get two numbers. */
export async function nextNetlistNumber(db: Queryable, revisionId: string): Promise<number> {
  const [row] = await db
    .select({ last: max(netlists.number) })
    .from(netlists)
    .where(eq(netlists.revisionId, revisionId));
  return (row?.last ?? 0) + 1;
}
