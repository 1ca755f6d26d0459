import { and, asc, desc, eq, isNotNull, isNull } from "drizzle-orm";
import { alias } from "drizzle-orm/pg-core";
import type { Queryable } from "@/db/client";
import { units } from "@/db/schema/boards";
import { attachments } from "@/db/schema/evidence";
import { faults, reworkDoubts, reworks } from "@/db/schema/faults";
import { users } from "@/db/schema/people";
import { procedureChecks } from "@/db/schema/procedures";
import {
  attemptVoids,
  attempts,
  checkPrerequisites,
  checks,
  concessions,
  holdLifts,
  readings,
  reopenings,
} from "@/db/schema/travelers";
import { evidenceColumns } from "./attachments";

/** Every check of a unit's traveler with its wording, retired ones included. */
export async function findTravelerChecks(db: Queryable, projectId: string, unitId: string) {
  return db
    .select({ check: checks, wording: procedureChecks })
    .from(checks)
    .innerJoin(procedureChecks, eq(procedureChecks.id, checks.procedureCheckId))
    .where(and(eq(checks.projectId, projectId), eq(checks.unitId, unitId)))
    .orderBy(asc(checks.position), asc(checks.createdAt));
}

/** Every attempt on a unit, newest first, with who made it and whether and why it is void. */
export async function findTravelerAttempts(db: Queryable, projectId: string, unitId: string) {
  const voiders = alias(users, "voiders");
  return db
    .select({ attempt: attempts, byName: users.name, void: attemptVoids, voidedByName: voiders.name })
    .from(attempts)
    .leftJoin(users, eq(users.id, attempts.userId))
    .leftJoin(attemptVoids, eq(attemptVoids.attemptId, attempts.id))
    .leftJoin(voiders, eq(voiders.id, attemptVoids.userId))
    .where(and(eq(attempts.projectId, projectId), eq(attempts.unitId, unitId)))
    .orderBy(desc(attempts.arrival));
}

export async function findTravelerReadings(db: Queryable, projectId: string, unitId: string) {
  return db
    .select({ reading: readings })
    .from(readings)
    .innerJoin(attempts, eq(attempts.id, readings.attemptId))
    .where(and(eq(attempts.projectId, projectId), eq(attempts.unitId, unitId)))
    .orderBy(asc(readings.position));
}

/** Files that belong to checks of the unit. */
export async function findTravelerEvidence(db: Queryable, projectId: string, unitId: string) {
  return db
    .select({ ...evidenceColumns, checkId: attachments.checkId, attemptId: attachments.attemptId })
    .from(attachments)
    .innerJoin(checks, eq(checks.id, attachments.checkId))
    .leftJoin(users, eq(users.id, attachments.uploadedBy))
    .where(and(eq(attachments.projectId, projectId), eq(checks.unitId, unitId), isNull(attachments.archivedAt)))
    .orderBy(asc(attachments.position), asc(attachments.createdAt));
}

export async function findTravelerReopenings(db: Queryable, projectId: string, unitId: string) {
  return db
    .select({ row: reopenings, byName: users.name })
    .from(reopenings)
    .innerJoin(checks, eq(checks.id, reopenings.checkId))
    .leftJoin(users, eq(users.id, reopenings.userId))
    .where(and(eq(checks.projectId, projectId), eq(checks.unitId, unitId)))
    .orderBy(desc(reopenings.createdAt));
}

export async function findTravelerConcessions(db: Queryable, projectId: string, unitId: string) {
  const withdrawers = alias(users, "withdrawers");
  return db
    .select({ row: concessions, byName: users.name, withdrawnByName: withdrawers.name })
    .from(concessions)
    .innerJoin(checks, eq(checks.id, concessions.checkId))
    .leftJoin(users, eq(users.id, concessions.userId))
    .leftJoin(withdrawers, eq(withdrawers.id, concessions.withdrawnBy))
    .where(and(eq(checks.projectId, projectId), eq(checks.unitId, unitId)))
    .orderBy(desc(concessions.createdAt));
}

export async function findTravelerHoldLifts(db: Queryable, projectId: string, unitId: string) {
  return db
    .select({ row: holdLifts, byName: users.name })
    .from(holdLifts)
    .innerJoin(checks, eq(checks.id, holdLifts.checkId))
    .leftJoin(users, eq(users.id, holdLifts.userId))
    .where(and(eq(checks.projectId, projectId), eq(checks.unitId, unitId)))
    .orderBy(desc(holdLifts.createdAt));
}

/** Reworks, of this unit or another, that put one of the unit's checks in doubt or spared it. */
export async function findTravelerDoubts(db: Queryable, projectId: string, unitId: string) {
  return db
    .select({
      checkId: reworkDoubts.checkId,
      origin: reworkDoubts.origin,
      reason: reworkDoubts.reason,
      id: reworks.id,
      number: reworks.number,
      kind: reworks.kind,
      wire: reworks.wire,
      serial: units.serial,
      userId: reworks.userId,
      byName: users.name,
      createdAt: reworks.createdAt,
    })
    .from(reworkDoubts)
    .innerJoin(reworks, eq(reworks.id, reworkDoubts.reworkId))
    .innerJoin(units, eq(units.id, reworks.unitId))
    .innerJoin(checks, eq(checks.id, reworkDoubts.checkId))
    .leftJoin(users, eq(users.id, reworks.userId))
    .where(and(eq(checks.projectId, projectId), eq(checks.unitId, unitId)))
    .orderBy(desc(reworks.arrival));
}

/** Faults that were seen at the unit's checks. */
export async function findTravelerFaults(db: Queryable, projectId: string, unitId: string) {
  return db
    .select({ checkId: faults.checkId, number: faults.number, title: faults.title, state: faults.state })
    .from(faults)
    .where(and(eq(faults.projectId, projectId), eq(faults.unitId, unitId), isNotNull(faults.checkId)))
    .orderBy(desc(faults.number));
}

/** What the unit's checks need, here and on other units, with the states these are in. */
export async function findTravelerPrerequisites(db: Queryable, projectId: string, unitId: string) {
  const waiting = alias(checks, "waiting");
  return db
    .select({
      waitingId: waiting.id,
      id: checks.id,
      unitId: checks.unitId,
      serial: units.serial,
      title: procedureChecks.title,
      state: checks.state,
    })
    .from(checkPrerequisites)
    .innerJoin(waiting, eq(waiting.id, checkPrerequisites.checkId))
    .innerJoin(checks, eq(checks.id, checkPrerequisites.needsCheckId))
    .innerJoin(units, eq(units.id, checks.unitId))
    .innerJoin(procedureChecks, eq(procedureChecks.id, checks.procedureCheckId))
    .where(
      and(
        eq(waiting.projectId, projectId),
        eq(waiting.unitId, unitId),
        isNull(waiting.retiredAt),
        isNull(checks.retiredAt),
      ),
    )
    .orderBy(asc(units.serial), asc(checks.position));
}
