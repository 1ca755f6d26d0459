import { and, asc, desc, eq, inArray, sql, type SQL } from "drizzle-orm";
import type { Queryable, Transaction } from "@/db/client";
import { boards, revisions, units } from "@/db/schema/boards";
import { faults, type FaultState } from "@/db/schema/faults";
import { users } from "@/db/schema/people";
import { procedureChecks } from "@/db/schema/procedures";
import { attempts, attemptVoids, checks, readings } from "@/db/schema/travelers";

type InProject = { projectId: string };

const NUMBERS = 4110;

/** Numbers are given one after another within a project, until the transaction ends. */
export async function nextFaultNumber(tx: Transaction, { projectId }: InProject): Promise<number> {
  await tx.execute(sql`select pg_advisory_xact_lock(${NUMBERS}, hashtext(${projectId}))`);
  const [row] = await tx
    .select({ last: sql<number>`coalesce(max(${faults.number}), 0)`.mapWith(Number) })
    .from(faults)
    .where(eq(faults.projectId, projectId));
  return (row?.last ?? 0) + 1;
}

export async function lockFault(tx: Transaction, scope: InProject, id: string) {
  const [row] = await tx
    .select()
    .from(faults)
    .where(and(eq(faults.projectId, scope.projectId), eq(faults.id, id)))
    .for("update");
  return row;
}

export async function findFaultById(db: Queryable, scope: InProject, id: string) {
  const [row] = await db
    .select({ id: faults.id, number: faults.number, unitId: faults.unitId })
    .from(faults)
    .where(and(eq(faults.projectId, scope.projectId), eq(faults.id, id)));
  return row;
}

/** Everything that is written of a fault, its title counting most. */
const written = sql`setweight(to_tsvector('english', ${faults.title}), 'A')
  || setweight(to_tsvector('english', concat_ws(' ', ${faults.symptom}, ${faults.cause}, ${faults.mend})), 'B')
  || setweight(to_tsvector('english', concat_ws(' ', ${faults.suspected}, ${faults.tried}, ${faults.lesson},
    ${faults.nextRevision})), 'C')`;

export type FaultFilter = {
  states?: readonly FaultState[] | undefined;
  board?: string | undefined;
  unit?: string | undefined;
  words?: string | undefined;
};

/** A name of a signal or pin, or the number, is found as it was typed; the rest by the stems of its words. */
const asTyped = (words: string): SQL =>
  sql`exists (select 1 from jsonb_array_elements_text(${faults.signals} || ${faults.pins}) named(name)
      where upper(replace(named.name, ' ', '')) = upper(replace(${words}, ' ', '')))
    or 'F' || ${faults.number} = upper(${words})`;

export async function findFaults(db: Queryable, scope: InProject, filter: FaultFilter) {
  const { words } = filter;
  return db
    .select({
      id: faults.id,
      number: faults.number,
      title: faults.title,
      symptom: faults.symptom,
      cause: faults.cause,
      state: faults.state,
      hours: faults.hours,
      signals: faults.signals,
      pins: faults.pins,
      serial: units.serial,
      board: boards.code,
      boardName: boards.name,
      byName: users.name,
      createdAt: faults.createdAt,
      closedAt: faults.closedAt,
      reworks: sql<number>`(select count(*) from reworks where reworks.fault_id = ${faults.id})`.mapWith(Number),
    })
    .from(faults)
    .innerJoin(units, eq(units.id, faults.unitId))
    .innerJoin(boards, eq(boards.id, units.boardId))
    .leftJoin(users, eq(users.id, faults.createdBy))
    .where(
      and(
        eq(faults.projectId, scope.projectId),
        filter.states ? inArray(faults.state, [...filter.states]) : undefined,
        filter.board ? eq(boards.code, filter.board) : undefined,
        filter.unit ? eq(units.serial, filter.unit) : undefined,
        words ? sql`(${written} @@ websearch_to_tsquery('english', ${words}) or ${asTyped(words)})` : undefined,
      ),
    )
    .orderBy(desc(faults.number));
}

export async function countFaultStates(db: Queryable, scope: InProject) {
  return db
    .select({ state: faults.state, count: sql<number>`count(*)`.mapWith(Number) })
    .from(faults)
    .where(eq(faults.projectId, scope.projectId))
    .groupBy(faults.state);
}

/** One fault with everything it hangs on. */
export async function findFault(db: Queryable, scope: InProject, number: number) {
  const [row] = await db
    .select({
      fault: faults,
      serial: units.serial,
      unitArchivedAt: units.archivedAt,
      board: { id: boards.id, code: boards.code, name: boards.name },
      revisionId: revisions.id,
      revision: revisions.letter,
      byName: users.name,
      checkTitle: procedureChecks.title,
      checkState: checks.state,
      checkStage: checks.stage,
    })
    .from(faults)
    .innerJoin(units, eq(units.id, faults.unitId))
    .innerJoin(boards, eq(boards.id, units.boardId))
    .innerJoin(revisions, eq(revisions.id, units.revisionId))
    .leftJoin(users, eq(users.id, faults.createdBy))
    .leftJoin(checks, eq(checks.id, faults.checkId))
    .leftJoin(procedureChecks, eq(procedureChecks.id, checks.procedureCheckId))
    .where(and(eq(faults.projectId, scope.projectId), eq(faults.number, number)));
  return row;
}

/** The newest attempts of a check that are not void. */
export async function findAttemptsOf(db: Queryable, scope: InProject, checkId: string, limit: number) {
  return db
    .select({
      id: attempts.id,
      verdict: attempts.verdict,
      record: attempts.record,
      note: attempts.note,
      performedAt: attempts.performedAt,
      byName: users.name,
      kind: procedureChecks.kind,
      spec: procedureChecks.spec,
    })
    .from(attempts)
    .innerJoin(procedureChecks, eq(procedureChecks.id, attempts.procedureCheckId))
    .leftJoin(attemptVoids, eq(attemptVoids.attemptId, attempts.id))
    .leftJoin(users, eq(users.id, attempts.userId))
    .where(and(eq(attempts.projectId, scope.projectId), eq(attempts.checkId, checkId), sql`${attemptVoids.id} is null`))
    .orderBy(desc(attempts.arrival))
    .limit(limit);
}

export async function findReadingsOf(db: Queryable, attemptIds: readonly string[]) {
  if (attemptIds.length === 0) return [];
  return db
    .select()
    .from(readings)
    .where(inArray(readings.attemptId, [...attemptIds]))
    .orderBy(asc(readings.position));
}

/** Every fault of the project with how well it fits the words; 0 where none is found. */
export async function findRankedFaults(
  db: Queryable,
  scope: InProject,
  { except, query }: { except: number | null; query: string },
) {
  return db
    .select({
      number: faults.number,
      title: faults.title,
      state: faults.state,
      symptom: faults.symptom,
      cause: faults.cause,
      mend: faults.mend,
      lesson: faults.lesson,
      signals: faults.signals,
      pins: faults.pins,
      serial: units.serial,
      // ts_rank divides by the number of words asked for; a long question is no worse a one.
      rank: sql<number>`ts_rank(${written}, websearch_to_tsquery('english', ${query}))
        * (numnode(websearch_to_tsquery('english', ${query})) + 1) / 2`.mapWith(Number),
    })
    .from(faults)
    .innerJoin(units, eq(units.id, faults.unitId))
    .where(and(eq(faults.projectId, scope.projectId), except === null ? undefined : sql`${faults.number} <> ${except}`))
    .orderBy(desc(faults.number))
    .limit(2000);
}
