import { and, asc, desc, eq, inArray, isNull, sql } from "drizzle-orm";
import type { Queryable } from "@/db/client";
import { boards, revisions, units } from "@/db/schema/boards";
import { reworks, reworkTouches } from "@/db/schema/faults";
import { netlists, probePlans, probeResults } from "@/db/schema/netlists";
import { users } from "@/db/schema/people";
import { procedureChecks } from "@/db/schema/procedures";
import { checks } from "@/db/schema/travelers";

type InProject = { projectId: string };

export async function findProbedUnit(db: Queryable, scope: InProject, serial: string) {
  const [row] = await db
    .select({
      id: units.id,
      serial: units.serial,
      archivedAt: units.archivedAt,
      revisionId: units.revisionId,
      board: { id: boards.id, code: boards.code, name: boards.name },
      letter: revisions.letter,
    })
    .from(units)
    .innerJoin(boards, eq(boards.id, units.boardId))
    .innerJoin(revisions, eq(revisions.id, units.revisionId))
    .where(and(eq(units.projectId, scope.projectId), eq(units.serial, serial)));
  return row;
}

/** Rounds of a unit with how far each is, the newest first. */
export async function findRounds(db: Queryable, scope: InProject, unitId: string) {
  return db
    .select({
      id: probePlans.id,
      count: probePlans.count,
      probed: sql<number>`(select count(distinct said.probe)::int from ${probeResults} said
        where said.plan_id = ${probePlans.id} and said.voided_at is null)`,
      options: probePlans.options,
      netlist: netlists.number,
      letter: revisions.letter,
      attemptId: probePlans.attemptId,
      by: users.name,
      closedAt: probePlans.closedAt,
      createdAt: probePlans.createdAt,
    })
    .from(probePlans)
    .innerJoin(netlists, eq(netlists.id, probePlans.netlistId))
    .innerJoin(revisions, eq(revisions.id, netlists.revisionId))
    .leftJoin(users, eq(users.id, probePlans.createdBy))
    .where(and(eq(probePlans.projectId, scope.projectId), eq(probePlans.unitId, unitId)))
    .orderBy(desc(probePlans.createdAt));
}

export async function findRound(db: Queryable, scope: InProject, id: string) {
  const [row] = await db
    .select({
      plan: probePlans,
      unit: { id: units.id, serial: units.serial, archivedAt: units.archivedAt },
      board: { id: boards.id, code: boards.code, name: boards.name },
      netlist: { id: netlists.id, number: netlists.number, content: netlists.content },
      letter: revisions.letter,
    })
    .from(probePlans)
    .innerJoin(units, eq(units.id, probePlans.unitId))
    .innerJoin(boards, eq(boards.id, units.boardId))
    .innerJoin(netlists, eq(netlists.id, probePlans.netlistId))
    .innerJoin(revisions, eq(revisions.id, netlists.revisionId))
    .where(and(eq(probePlans.projectId, scope.projectId), eq(probePlans.id, id)));
  return row;
}

/** The row stays locked until the transaction ends: nothing is said after a round is closed. */
export async function lockRound(db: Queryable, scope: InProject, id: string) {
  const [row] = await db
    .select({
      id: probePlans.id,
      unitId: probePlans.unitId,
      count: probePlans.count,
      closedAt: probePlans.closedAt,
      checkId: probePlans.checkId,
    })
    .from(probePlans)
    .where(and(eq(probePlans.projectId, scope.projectId), eq(probePlans.id, id)))
    .for("update");
  return row;
}

/** What was said and not taken back, in the order in which it arrived. */
export async function findResults(db: Queryable, planId: string) {
  return db
    .select({
      id: probeResults.id,
      probe: probeResults.probe,
      beeps: probeResults.beeps,
      ohm: probeResults.ohm,
      typed: probeResults.typed,
      userId: probeResults.userId,
      by: users.name,
      performedAt: probeResults.performedAt,
    })
    .from(probeResults)
    .leftJoin(users, eq(users.id, probeResults.userId))
    .where(and(eq(probeResults.planId, planId), isNull(probeResults.voidedAt)))
    .orderBy(asc(probeResults.recordedAt), asc(probeResults.performedAt));
}

/** Checks of the unit that a round can become an attempt of: statements of the continuity stage. */
export async function findContinuityChecks(db: Queryable, scope: InProject, unitId: string) {
  return db
    .select({ id: checks.id, title: procedureChecks.title, state: checks.state })
    .from(checks)
    .innerJoin(procedureChecks, eq(procedureChecks.id, checks.procedureCheckId))
    .where(
      and(
        eq(checks.projectId, scope.projectId),
        eq(checks.unitId, unitId),
        eq(checks.stage, "continuity"),
        eq(procedureChecks.kind, "statement"),
        isNull(checks.retiredAt),
      ),
    )
    .orderBy(asc(checks.position));
}

/** Signals and pins that the reworks of a unit touched. */
export async function findTouched(db: Queryable, scope: InProject, unitId: string) {
  return db
    .select({ number: reworks.number, what: reworks.what, kind: reworkTouches.kind, name: reworkTouches.name })
    .from(reworks)
    .innerJoin(reworkTouches, eq(reworkTouches.reworkId, reworks.id))
    .where(
      and(
        eq(reworks.projectId, scope.projectId),
        eq(reworks.unitId, unitId),
        inArray(reworkTouches.kind, ["signal", "pin", "rail"]),
      ),
    )
    .orderBy(desc(reworks.number));
}

/** When one's last probes were, the newest first: one's own pace. */
export async function findOwnTimes(db: Queryable, scope: InProject, userId: string, most: number): Promise<Date[]> {
  const rows = await db
    .select({ at: probeResults.performedAt })
    .from(probeResults)
    .innerJoin(probePlans, eq(probePlans.id, probeResults.planId))
    .where(and(eq(probePlans.projectId, scope.projectId), eq(probeResults.userId, userId)))
    .orderBy(desc(probeResults.performedAt))
    .limit(most);
  return rows.map(({ at }) => at);
}

export async function findRoundState(db: Queryable, scope: InProject, id: string) {
  const [row] = await db
    .select({ closedAt: probePlans.closedAt })
    .from(probePlans)
    .where(and(eq(probePlans.projectId, scope.projectId), eq(probePlans.id, id)));
  return row;
}
