import { and, desc, eq, gte, isNull, sql } from "drizzle-orm";
import type { Queryable } from "@/db/client";
import { units } from "@/db/schema/boards";
import { benchSessions } from "@/db/schema/order";
import { users } from "@/db/schema/people";
import { attempts, attemptVoids, checks } from "@/db/schema/travelers";

type InProject = { projectId: string };

/** Attempts since an instant, voided ones left out: who did what stage of which unit, and when. */
export async function findAttemptTimes(db: Queryable, scope: InProject, since: Date) {
  return db
    .select({
      at: attempts.performedAt,
      checkId: attempts.checkId,
      stage: checks.stage,
      serial: units.serial,
      userId: attempts.userId,
    })
    .from(attempts)
    .innerJoin(checks, eq(checks.id, attempts.checkId))
    .innerJoin(units, eq(units.id, attempts.unitId))
    .where(
      and(
        eq(attempts.projectId, scope.projectId),
        gte(attempts.performedAt, since),
        sql`not exists (select 1 from ${attemptVoids} where ${attemptVoids.attemptId} = ${attempts.id})`,
      ),
    )
    .orderBy(attempts.performedAt, attempts.arrival);
}

/** Sessions that were started by hand since an instant, the newest first. */
export async function findTypedSessions(db: Queryable, scope: InProject, since: Date) {
  return db
    .select()
    .from(benchSessions)
    .where(and(eq(benchSessions.projectId, scope.projectId), gte(benchSessions.startedAt, since)))
    .orderBy(desc(benchSessions.startedAt));
}

/** The sessions of one builder that nobody stopped, locked until the transaction ends, the newest first. */
export async function lockOpenSessions(db: Queryable, scope: InProject, userId: string) {
  return db
    .select()
    .from(benchSessions)
    .where(
      and(
        eq(benchSessions.projectId, scope.projectId),
        eq(benchSessions.userId, userId),
        isNull(benchSessions.endedAt),
      ),
    )
    .orderBy(desc(benchSessions.startedAt))
    .for("update");
}

/** Names of everybody who ever worked at the project's bench, members or not. */
export async function findBuilders(db: Queryable, scope: InProject) {
  return db
    .select({ id: users.id, name: users.name })
    .from(users)
    .where(
      sql`${users.id} in (select user_id from attempts where project_id = ${scope.projectId}
        union select user_id from bench_sessions where project_id = ${scope.projectId})`,
    );
}
