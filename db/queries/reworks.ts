import { and, asc, desc, eq, inArray, isNull, sql } from "drizzle-orm";
import type { Queryable } from "@/db/client";
import { boards, revisions, slotOccupancies, units } from "@/db/schema/boards";
import { faults, reworkDoubts, reworkTouches, reworks } from "@/db/schema/faults";
import { blocks, boardBlocks, bomLines } from "@/db/schema/parts";
import { users } from "@/db/schema/people";
import type { Coverage } from "@/db/schema/procedures";
import { attempts, checks } from "@/db/schema/travelers";
import { connectors, pins } from "@/db/schema/wiring";
import { affectedUnits } from "./check-histories";
import type { StandingCheckRow } from "./travelers";

type InProject = { projectId: string };

export async function findReworkUnit(db: Queryable, scope: InProject, serial: string) {
  const [row] = await db
    .select({
      id: units.id,
      serial: units.serial,
      archivedAt: units.archivedAt,
      board: { id: boards.id, code: boards.code, name: boards.name },
      revision: { id: revisions.id, letter: revisions.letter },
      isPlaced: sql<boolean>`exists (select 1 from ${slotOccupancies} sits
        where sits.unit_id = ${units.id} and sits.removed_at is null)`,
    })
    .from(units)
    .innerJoin(boards, eq(boards.id, units.boardId))
    .innerJoin(revisions, eq(revisions.id, units.revisionId))
    .where(and(eq(units.projectId, scope.projectId), eq(units.serial, serial)));
  return row;
}

export type ReworkUnit = NonNullable<Awaited<ReturnType<typeof findReworkUnit>>>;

/** Units that sit in a slot now, apart from archived ones. */
export async function findPlacedUnits(db: Queryable, scope: InProject): Promise<string[]> {
  const rows = await db
    .select({ id: units.id })
    .from(slotOccupancies)
    .innerJoin(units, eq(units.id, slotOccupancies.unitId))
    .where(and(eq(units.projectId, scope.projectId), isNull(slotOccupancies.removedAt), isNull(units.archivedAt)));
  return rows.map(({ id }) => id);
}

export type CoveringRow = StandingCheckRow & {
  board: string;
  covers: Coverage;
  /** Of the newest attempt, void or not; 0 where there is none. */
  newest_arrival: number;
  /** When the last valid attempt was carried out. */
  last_at: string | null;
};

/** Every live check of the units and of those that depend on them, with what it covers. */
export async function findCoveringChecks(
  db: Queryable,
  { projectId }: InProject,
  unitIds: readonly string[],
): Promise<CoveringRow[]> {
  return await db.execute<CoveringRow>(sql`
    with recursive ${affectedUnits(projectId, unitIds)}
    select c.id, c.unit_id, units.serial, c.stage, procedure_checks.title, c.position, c.hold_point, c.state,
      boards.code as board, procedure_checks.covers,
      exists (select 1 from hold_lifts where hold_lifts.check_id = c.id) as lifted,
      (select coalesce(json_agg(edge.needs_check_id), '[]') from check_prerequisites edge where edge.check_id = c.id) as needs,
      (select coalesce(max(a.arrival), 0)::float8 from attempts a where a.check_id = c.id) as newest_arrival,
      (select to_json(a.performed_at) #>> '{}' from attempts a where a.id = c.last_attempt_id) as last_at
    from checks c
    join units on units.id = c.unit_id and units.archived_at is null
    join boards on boards.id = units.board_id
    join procedure_checks on procedure_checks.id = c.procedure_check_id
    where c.unit_id in (select unit_id from affected) and c.retired_at is null`);
}

/** Pins that carry a signal, by the code of their board. */
export async function findNamedPins(db: Queryable, scope: InProject, codes: readonly string[]) {
  if (codes.length === 0) return [];
  return db
    .select({
      board: boards.code,
      connector: connectors.reference,
      pin: pins.pin,
      signal: pins.signal,
      role: pins.role,
    })
    .from(pins)
    .innerJoin(connectors, eq(connectors.id, pins.connectorId))
    .innerJoin(boards, eq(boards.id, connectors.boardId))
    .where(and(eq(connectors.projectId, scope.projectId), inArray(boards.code, [...codes])))
    .orderBy(asc(connectors.position), asc(pins.pin));
}

export type CopperPoint = { part: string; pin: string; net: string };

/** Points of the newest netlist of a revision: of the named parts, in capitals, or as many as asked for of all. */
export async function findCopper(
  db: Queryable,
  scope: InProject,
  revisionId: string,
  wanted: { parts?: readonly string[]; limit: number },
): Promise<CopperPoint[]> {
  const { parts, limit } = wanted;
  if (parts?.length === 0) return [];
  return await db.execute<CopperPoint>(sql`
    with newest as (
      select content from netlists where project_id = ${scope.projectId} and revision_id = ${revisionId}
      order by number desc limit 1)
    select point ->> 'part' as part, point ->> 'pin' as pin, net ->> 'name' as net
    from newest, jsonb_array_elements(content -> 'nets') net, jsonb_array_elements(net -> 'points') point
    where point ->> 'part' <> '' and ${
      parts === undefined
        ? sql`true`
        : sql`upper(point ->> 'part') in (select value from json_array_elements_text(${JSON.stringify(parts)}::json))`
    }
    limit ${limit}`);
}

export async function findBlockNames(db: Queryable, boardId: string): Promise<string[]> {
  const rows = await db
    .select({ name: blocks.name })
    .from(boardBlocks)
    .innerJoin(blocks, eq(blocks.id, boardBlocks.blockId))
    .where(eq(boardBlocks.boardId, boardId))
    .orderBy(asc(blocks.name));
  return rows.map(({ name }) => name);
}

export async function findBomDesignators(db: Queryable, boardId: string) {
  return db
    .select({ designators: bomLines.designators, part: bomLines.partNumber })
    .from(bomLines)
    .where(eq(bomLines.boardId, boardId))
    .orderBy(asc(bomLines.position));
}

const reworkColumns = {
  id: reworks.id,
  number: reworks.number,
  kind: reworks.kind,
  what: reworks.what,
  why: reworks.why,
  wire: reworks.wire,
  carriedFrom: reworks.carriedFrom,
  performedAt: reworks.performedAt,
  createdAt: reworks.createdAt,
  unitId: reworks.unitId,
  serial: units.serial,
  boardId: units.boardId,
  userId: reworks.userId,
  byName: users.name,
  faultId: reworks.faultId,
  faultNumber: faults.number,
  faultTitle: faults.title,
};

const withNames = (db: Queryable) =>
  db
    .select(reworkColumns)
    .from(reworks)
    .innerJoin(units, eq(units.id, reworks.unitId))
    .leftJoin(users, eq(users.id, reworks.userId))
    .leftJoin(faults, eq(faults.id, reworks.faultId));

export async function findReworksOfUnits(db: Queryable, scope: InProject, unitIds: readonly string[]) {
  if (unitIds.length === 0) return [];
  return withNames(db)
    .where(and(eq(reworks.projectId, scope.projectId), inArray(reworks.unitId, [...unitIds])))
    .orderBy(desc(reworks.arrival));
}

export type ReworkRow = Awaited<ReturnType<typeof findReworksOfUnits>>[number];

export async function findReworksOfFault(db: Queryable, scope: InProject, faultId: string): Promise<ReworkRow[]> {
  return withNames(db)
    .where(and(eq(reworks.projectId, scope.projectId), eq(reworks.faultId, faultId)))
    .orderBy(desc(reworks.arrival));
}

export async function findRework(db: Queryable, scope: InProject, id: string): Promise<ReworkRow | undefined> {
  const [row] = await withNames(db).where(and(eq(reworks.projectId, scope.projectId), eq(reworks.id, id)));
  return row;
}

export async function findTouches(db: Queryable, reworkIds: readonly string[]) {
  if (reworkIds.length === 0) return [];
  return db
    .select()
    .from(reworkTouches)
    .where(inArray(reworkTouches.reworkId, [...reworkIds]))
    .orderBy(asc(reworkTouches.name));
}

export type DoubtRow = {
  rework_id: string;
  check_id: string;
  serial: string;
  title: string;
  position: number;
  origin: "touched" | "depends" | "added" | "spared";
  reason: string;
  /** Whether a valid attempt has arrived since. */
  answered: boolean;
  /** Whether there was a pass to doubt: what the newest valid attempt of that time said. */
  had_pass: boolean;
  retired: boolean;
};

/** What reworks put in doubt, and what has been repeated since. */
export async function findDoubts(db: Queryable, reworkIds: readonly string[]): Promise<DoubtRow[]> {
  if (reworkIds.length === 0) return [];
  return await db.execute<DoubtRow>(sql`
    select d.rework_id, d.check_id, units.serial, wording.title, c.position, d.origin, d.reason,
      c.retired_at is not null as retired,
      exists (select 1 from attempts a where a.check_id = c.id and a.arrival > d.after_arrival
        and not exists (select 1 from attempt_voids v where v.attempt_id = a.id)) as answered,
      coalesce((select a.verdict <> 'does-not-conform' from attempts a where a.check_id = c.id
        and a.arrival <= d.after_arrival and not exists (select 1 from attempt_voids v where v.attempt_id = a.id)
        order by a.arrival desc limit 1), false) as had_pass
    from ${reworkDoubts} d
    join ${checks} c on c.id = d.check_id
    join units on units.id = c.unit_id
    join procedure_checks wording on wording.id = c.procedure_check_id
    where d.rework_id in (select value::uuid from json_array_elements_text(${JSON.stringify(reworkIds)}::json))
    order by units.serial, c.position`);
}

export async function findNextReworkNumber(db: Queryable, unitId: string): Promise<number> {
  const [row] = await db
    .select({ last: sql<number>`coalesce(max(${reworks.number}), 0)`.mapWith(Number) })
    .from(reworks)
    .where(eq(reworks.unitId, unitId));
  return (row?.last ?? 0) + 1;
}

/** The newest attempts of one person, for the pace at which they work. */
export async function findOwnAttempts(db: Queryable, scope: InProject, userId: string, limit: number) {
  return db
    .select({ at: attempts.performedAt, checkId: attempts.checkId, stage: checks.stage })
    .from(attempts)
    .innerJoin(checks, eq(checks.id, attempts.checkId))
    .where(and(eq(attempts.projectId, scope.projectId), eq(attempts.userId, userId)))
    .orderBy(desc(attempts.arrival))
    .limit(limit);
}
