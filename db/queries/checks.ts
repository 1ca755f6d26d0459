import { and, eq, isNull, sql } from "drizzle-orm";
import type { Queryable } from "@/db/client";
import { units } from "@/db/schema/boards";
import { instruments, users } from "@/db/schema/people";
import { procedureChecks } from "@/db/schema/procedures";
import { memberships } from "@/db/schema/projects";
import {
  attemptVoids,
  attempts,
  checks,
  concessions,
  holdLifts,
  type CheckState,
  type Verdict,
} from "@/db/schema/travelers";

const checkColumns = {
  id: checks.id,
  unitId: checks.unitId,
  serial: units.serial,
  unitArchivedAt: units.archivedAt,
  procedureCheckId: checks.procedureCheckId,
  title: procedureChecks.title,
  kind: procedureChecks.kind,
  spec: procedureChecks.spec,
  holdPoint: checks.holdPoint,
  state: checks.state,
  lastAttemptId: checks.lastAttemptId,
  retiredAt: checks.retiredAt,
  /** Whether another check waits for this one: then its state moves others. */
  hasDependants: sql<boolean>`${checks.holdPoint} or exists (
    select 1 from check_prerequisites edge where edge.needs_check_id = ${checks.id})`,
};

/** One check with its wording and its unit. */
export async function findCheck(db: Queryable, projectId: string, checkId: string) {
  const [row] = await db
    .select(checkColumns)
    .from(checks)
    .innerJoin(units, eq(units.id, checks.unitId))
    .innerJoin(procedureChecks, eq(procedureChecks.id, checks.procedureCheckId))
    .where(and(eq(checks.projectId, projectId), eq(checks.id, checkId)))
    .limit(1);
  return row;
}

export type CheckRow = NonNullable<Awaited<ReturnType<typeof findCheck>>>;

/** An instrument only if it is the person's own and not put away. */
export async function findOwnInstrument(db: Queryable, userId: string, instrumentId: string) {
  const [row] = await db
    .select({
      id: instruments.id,
      name: instruments.name,
      ranges: instruments.ranges,
      calibrationNote: instruments.calibrationNote,
    })
    .from(instruments)
    .where(and(eq(instruments.id, instrumentId), eq(instruments.userId, userId), isNull(instruments.archivedAt)))
    .limit(1);
  return row;
}

export type Standing = {
  state: CheckState;
  retired: boolean;
  /** Whether an earlier hold point that is not lifted, or a prerequisite, does not hold. */
  blocked: boolean;
  /** Whether there is a valid attempt already. */
  attempted: boolean;
  /** The newest attempt of somebody else that is not voided, among the newest twenty. */
  other: {
    name: string | null;
    recordedAt: string;
    secondsAgo: number;
    arrival: number;
    record: unknown;
    /** An overload comes as the text Infinity, since JSON has no such number. */
    readings: { label: string; typed: string; value: number | string; unit: string; verdict: Verdict }[];
  } | null;
};

/** How a check stands before an attempt is recorded on it; read it with the locks of its unit held. */
export async function findStanding(db: Queryable, checkId: string, userId: string): Promise<Standing | undefined> {
  const [row] = await db.execute<Standing>(sql`
    with valid as materialized (
      select a.id, a.user_id, a.recorded_at, a.arrival, a.record from attempts a
      where a.check_id = ${checkId} and not exists (select 1 from attempt_voids v where v.attempt_id = a.id)
      order by a.arrival desc limit 20)
    select c.state, c.retired_at is not null as retired,
      exists (
        select 1 from checks h
        where h.unit_id = c.unit_id and h.position < c.position and h.hold_point and h.retired_at is null
          and h.state not in ('passed', 'conceded') and not exists (select 1 from hold_lifts where hold_lifts.check_id = h.id)
      ) or exists (
        select 1 from check_prerequisites edge join checks needed on needed.id = edge.needs_check_id
        where edge.check_id = c.id and needed.retired_at is null and needed.state not in ('passed', 'conceded')
      ) as blocked,
      exists (select 1 from valid) as attempted,
      (select json_build_object('name', users.name, 'recordedAt', valid.recorded_at, 'arrival', valid.arrival, 'record', valid.record,
          'secondsAgo', extract(epoch from clock_timestamp() - valid.recorded_at),
          'readings', coalesce((select json_agg(json_build_object('label', r.label, 'typed', r.typed, 'value', r.value,
            'unit', r.unit, 'verdict', r.verdict) order by r.position) from readings r where r.attempt_id = valid.id), '[]'))
        from valid left join users on users.id = valid.user_id
        where valid.user_id is distinct from ${userId} order by valid.arrival desc limit 1) as other
    from checks c where c.id = ${checkId}`);
  return row;
}

/** One attempt with its check and whether it was voided. */
export async function findAttempt(db: Queryable, projectId: string, attemptId: string) {
  const [row] = await db
    .select({
      id: attempts.id,
      checkId: attempts.checkId,
      userId: attempts.userId,
      recordedAt: attempts.recordedAt,
      now: sql<Date>`clock_timestamp()`.mapWith(attempts.recordedAt),
      voidId: attemptVoids.id,
    })
    .from(attempts)
    .leftJoin(attemptVoids, eq(attemptVoids.attemptId, attempts.id))
    .where(and(eq(attempts.projectId, projectId), eq(attempts.id, attemptId)))
    .limit(1);
  return row;
}

/** The newest attempt on a check, valid or not: a reopening concerns everything up to it. */
export async function findNewestArrival(db: Queryable, checkId: string): Promise<number> {
  const [row] = await db
    .select({ arrival: sql<number>`coalesce(max(${attempts.arrival}), 0)::float8` })
    .from(attempts)
    .where(eq(attempts.checkId, checkId));
  return row?.arrival ?? 0;
}

/** Who carried out the given attempt, if they are still in the project and want mail when a check of theirs is reopened. */
export async function findBuilderToTell(
  db: Queryable,
  projectId: string,
  attemptId: string,
): Promise<string | undefined> {
  const [row] = await db
    .select({ userId: users.id })
    .from(attempts)
    .innerJoin(users, eq(users.id, attempts.userId))
    .innerJoin(memberships, and(eq(memberships.userId, users.id), eq(memberships.projectId, projectId)))
    .where(
      and(
        eq(attempts.projectId, projectId),
        eq(attempts.id, attemptId),
        eq(users.mailOnReopen, true),
        isNull(users.mailBouncedAt),
      ),
    )
    .limit(1);
  return row?.userId;
}

/** One concession, only if its check is of this project. */
export async function findConcession(db: Queryable, projectId: string, concessionId: string) {
  const [row] = await db
    .select({ id: concessions.id, checkId: concessions.checkId, withdrawnAt: concessions.withdrawnAt })
    .from(concessions)
    .innerJoin(checks, and(eq(checks.id, concessions.checkId), eq(checks.projectId, projectId)))
    .where(eq(concessions.id, concessionId))
    .limit(1);
  return row;
}

export async function isLifted(db: Queryable, checkId: string): Promise<boolean> {
  const rows = await db.select({ id: holdLifts.id }).from(holdLifts).where(eq(holdLifts.checkId, checkId)).limit(1);
  return rows.length > 0;
}
