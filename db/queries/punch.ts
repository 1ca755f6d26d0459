import { and, asc, eq, isNull, ne, sql } from "drizzle-orm";
import type { Queryable, Transaction } from "@/db/client";
import { boards, revisions, units } from "@/db/schema/boards";
import { faults, punchItems, reworks } from "@/db/schema/faults";
import { users } from "@/db/schema/people";
import { procedureChecks } from "@/db/schema/procedures";
import { checks, concessions } from "@/db/schema/travelers";

type InProject = { projectId: string };
type Revision = { boardId: string; letter: string };

/** Units of the board made from an earlier revision (Z comes before AA); archived ones, too: what they taught stays true. */
const ofEarlier = (scope: InProject, { boardId, letter }: Revision) =>
  and(
    eq(units.projectId, scope.projectId),
    eq(units.boardId, boardId),
    sql`(length(${revisions.letter}), ${revisions.letter}) < (length(${letter}), ${letter})`,
  );

/** Faults of earlier revisions that say what the next one should change. */
export async function findFaultsToChange(db: Queryable, scope: InProject, revision: Revision) {
  return db
    .select({
      id: faults.id,
      number: faults.number,
      title: faults.title,
      nextRevision: faults.nextRevision,
      unitId: units.id,
    })
    .from(faults)
    .innerJoin(units, eq(units.id, faults.unitId))
    .innerJoin(revisions, eq(revisions.id, units.revisionId))
    .where(and(ofEarlier(scope, revision), ne(faults.nextRevision, ""), ne(faults.state, "no-fault")))
    .orderBy(asc(faults.number));
}

export async function findStandingConcessions(db: Queryable, scope: InProject, revision: Revision) {
  return db
    .select({ id: concessions.id, title: procedureChecks.title, reason: concessions.reason, unitId: units.id })
    .from(concessions)
    .innerJoin(checks, eq(checks.id, concessions.checkId))
    .innerJoin(procedureChecks, eq(procedureChecks.id, checks.procedureCheckId))
    .innerJoin(units, eq(units.id, checks.unitId))
    .innerJoin(revisions, eq(revisions.id, units.revisionId))
    .where(and(ofEarlier(scope, revision), isNull(concessions.withdrawnAt), eq(checks.state, "conceded")))
    .orderBy(asc(concessions.createdAt), asc(concessions.id));
}

/** A rework that was carried over from another unit is the same change of the design: only the first one counts. */
export async function findReworksToTake(db: Queryable, scope: InProject, revision: Revision) {
  return db
    .select({
      id: reworks.id,
      kind: reworks.kind,
      number: reworks.number,
      what: reworks.what,
      why: reworks.why,
      wire: reworks.wire,
      unitId: units.id,
    })
    .from(reworks)
    .innerJoin(units, eq(units.id, reworks.unitId))
    .innerJoin(revisions, eq(revisions.id, units.revisionId))
    .where(and(ofEarlier(scope, revision), isNull(reworks.carriedFrom)))
    .orderBy(asc(reworks.arrival));
}

/** The punch lists of all revisions of a board, in the order in which they were taken. */
export async function findPunchItems(db: Queryable, scope: InProject, boardId: string) {
  return db
    .select({
      item: punchItems,
      letter: revisions.letter,
      serial: units.serial,
      dealtByName: users.name,
      faultNumber: faults.number,
      reworkNumber: reworks.number,
    })
    .from(punchItems)
    .innerJoin(revisions, eq(revisions.id, punchItems.revisionId))
    .leftJoin(units, eq(units.id, punchItems.unitId))
    .leftJoin(users, eq(users.id, punchItems.dealtBy))
    .leftJoin(faults, and(eq(punchItems.source, "fault"), eq(faults.id, punchItems.sourceId)))
    .leftJoin(reworks, and(eq(punchItems.source, "rework"), eq(reworks.id, punchItems.sourceId)))
    .where(and(eq(punchItems.projectId, scope.projectId), eq(revisions.boardId, boardId)))
    .orderBy(asc(punchItems.source), asc(punchItems.createdAt), asc(punchItems.text));
}

export type PunchRow = Awaited<ReturnType<typeof findPunchItems>>[number];

export async function lockPunchItem(tx: Transaction, scope: InProject, id: string) {
  const [row] = await tx
    .select({ item: punchItems, letter: revisions.letter, code: boards.code })
    .from(punchItems)
    .innerJoin(revisions, eq(revisions.id, punchItems.revisionId))
    .innerJoin(boards, eq(boards.id, revisions.boardId))
    .where(and(eq(punchItems.projectId, scope.projectId), eq(punchItems.id, id)))
    .for("update", { of: punchItems });
  return row;
}
