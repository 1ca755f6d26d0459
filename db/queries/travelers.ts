import { and, asc, desc, eq, isNull, sql } from "drizzle-orm";
import type { Queryable } from "@/db/client";
import { boards, revisions, slotOccupancies, slots, units } from "@/db/schema/boards";
import { procedureChecks, procedures, type Stage } from "@/db/schema/procedures";
import { checks, travelers, type CheckState } from "@/db/schema/travelers";
import { edgeColumns } from "./connectors";

export async function findUnitIds(db: Queryable, projectId: string): Promise<string[]> {
  const rows = await db.select({ id: units.id }).from(units).where(eq(units.projectId, projectId));
  return rows.map((row) => row.id);
}

/** One unit with its board, revision, place, traveler and the number of the newest issued procedure. */
export async function findUnitWithTraveler(db: Queryable, projectId: string, serial: string) {
  const newest = sql<
    number | null
  >`(select max(n.number) from ${procedures} n where n.board_id = ${units.boardId} and n.state = 'issued')`;
  const [row] = await db
    .select({
      unit: {
        id: units.id,
        serial: units.serial,
        note: units.note,
        archivedAt: units.archivedAt,
        version: units.version,
      },
      board: {
        id: boards.id,
        code: boards.code,
        name: boards.name,
        ...edgeColumns,
      },
      revision: { id: revisions.id, letter: revisions.letter },
      position: slots.position,
      label: slots.label,
      travelerId: travelers.id,
      procedureId: travelers.procedureId,
      number: procedures.number,
      newest,
      reworks: sql<number>`(select count(*) from reworks where reworks.unit_id = ${units.id})`.mapWith(Number),
      faults: sql<number>`(select count(*) from faults
        where faults.unit_id = ${units.id} and faults.state in ('open', 'traced'))`.mapWith(Number),
    })
    .from(units)
    .innerJoin(boards, eq(boards.id, units.boardId))
    .innerJoin(revisions, eq(revisions.id, units.revisionId))
    .leftJoin(slotOccupancies, and(eq(slotOccupancies.unitId, units.id), isNull(slotOccupancies.removedAt)))
    .leftJoin(slots, eq(slots.id, slotOccupancies.slotId))
    .leftJoin(travelers, eq(travelers.unitId, units.id))
    .leftJoin(procedures, eq(procedures.id, travelers.procedureId))
    .where(and(eq(units.projectId, projectId), eq(units.serial, serial)))
    .limit(1);
  return row;
}

/** The newest issued procedure of a board. */
export async function findNewestProcedure(db: Queryable, boardId: string) {
  const [row] = await db
    .select({ id: procedures.id, number: procedures.number })
    .from(procedures)
    .where(and(eq(procedures.boardId, boardId), eq(procedures.state, "issued")))
    .orderBy(desc(procedures.number))
    .limit(1);
  return row;
}

export type ProcedureCheckRow = typeof procedureChecks.$inferSelect;

export async function findProcedureChecks(db: Queryable, procedureId: string): Promise<ProcedureCheckRow[]> {
  return db
    .select()
    .from(procedureChecks)
    .where(eq(procedureChecks.procedureId, procedureId))
    .orderBy(asc(procedureChecks.position));
}

export type StandingCheckRow = {
  id: string;
  unit_id: string;
  serial: string;
  stage: Stage;
  title: string;
  position: number;
  hold_point: boolean;
  lifted: boolean;
  needs: string[];
  state: CheckState;
};

/** Every live check of a project with its cached state and what it waits for. Units that are archived stay out unless asked for. */
export async function findStandingChecks(
  db: Queryable,
  projectId: string,
  withArchived = false,
): Promise<StandingCheckRow[]> {
  return await db.execute<StandingCheckRow>(sql`
    select c.id, c.unit_id, units.serial, c.stage, procedure_checks.title, c.position, c.hold_point, c.state,
      exists (select 1 from hold_lifts where hold_lifts.check_id = c.id) as lifted,
      coalesce(edges.needs, '[]') as needs
    from checks c
    join units on units.id = c.unit_id
    join procedure_checks on procedure_checks.id = c.procedure_check_id
    left join (
      select check_prerequisites.check_id, json_agg(check_prerequisites.needs_check_id) as needs
      from check_prerequisites join checks own on own.id = check_prerequisites.check_id and own.project_id = ${projectId}
      group by check_prerequisites.check_id) edges on edges.check_id = c.id
    where c.project_id = ${projectId} and c.retired_at is null and (${withArchived} or units.archived_at is null)`);
}

/** The live check rows of one unit, in the order of its traveler. */
export async function findChecksOfUnit(db: Queryable, projectId: string, unitId: string) {
  return db
    .select()
    .from(checks)
    .where(and(eq(checks.projectId, projectId), eq(checks.unitId, unitId), isNull(checks.retiredAt)))
    .orderBy(asc(checks.position));
}
