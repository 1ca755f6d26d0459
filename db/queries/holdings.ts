import { sql } from "drizzle-orm";
import type { Queryable } from "@/db/client";

type InProject = { projectId: string };

export type UnitHoldings = {
  unitId: string;
  checks: number;
  attempts: number;
  files: number;
  faults: number;
  reworks: number;
  /** Prerequisites by which checks of other units wait for this one … */
  waitsOfOtherUnits: number;
  /** … and those among them that belong to units of other boards. */
  waitsOfOtherBoards: number;
};

/** Evidence of the units that no log entry shows. */
export const filesOf = (scope: InProject, unitIds: readonly string[]) => sql`
  a.project_id = ${scope.projectId} and a.log_entry_id is null and a.unit_id in ${listed(unitIds)}`;

const listed = (ids: readonly string[]) =>
  sql`(select value::uuid from json_array_elements_text(${JSON.stringify(ids)}::json))`;

/** What hangs on each of the given units, in one query whatever their number. */
export async function findHoldings(
  db: Queryable,
  scope: InProject,
  unitIds: readonly string[],
): Promise<UnitHoldings[]> {
  if (unitIds.length === 0) return [];
  return await db.execute<UnitHoldings>(sql`
    with held as (select u.id, u.board_id from units u where u.project_id = ${scope.projectId} and u.id in ${listed(unitIds)}),
    waits as (
      select needed.unit_id, other.board_id from checks needed
        join held on held.id = needed.unit_id
        join check_prerequisites edge on edge.needs_check_id = needed.id
        join checks waiting on waiting.id = edge.check_id and waiting.unit_id <> needed.unit_id
        join units other on other.id = waiting.unit_id)
    select held.id as "unitId",
      (select count(*)::int from checks c where c.unit_id = held.id) as checks,
      (select count(*)::int from attempts t where t.unit_id = held.id) as attempts,
      (select count(*)::int from attachments a where a.unit_id = held.id and ${filesOf(scope, unitIds)}) as files,
      (select count(*)::int from faults f where f.unit_id = held.id) as faults,
      (select count(*)::int from reworks w where w.unit_id = held.id) as reworks,
      (select count(*)::int from waits where waits.unit_id = held.id) as "waitsOfOtherUnits",
      (select count(*)::int from waits where waits.unit_id = held.id and waits.board_id <> held.board_id) as "waitsOfOtherBoards"
    from held`);
}

/** Units outside the given ones with a check that waits for one of theirs, or that a rework of theirs put in doubt. */
export async function findWaitingUnits(db: Queryable, scope: InProject, unitIds: readonly string[]): Promise<string[]> {
  const rows = await db.execute<{ id: string }>(sql`
    select distinct waiting.unit_id as id from checks needed
      join check_prerequisites edge on edge.needs_check_id = needed.id
      join checks waiting on waiting.id = edge.check_id
    where needed.project_id = ${scope.projectId} and needed.unit_id in ${listed(unitIds)}
      and waiting.unit_id not in ${listed(unitIds)}
    union
    select distinct doubted.unit_id from reworks
      join rework_doubts d on d.rework_id = reworks.id
      join checks doubted on doubted.id = d.check_id
    where reworks.project_id = ${scope.projectId} and reworks.unit_id in ${listed(unitIds)}
      and doubted.unit_id not in ${listed(unitIds)}
    order by 1`);
  return rows.map((row) => row.id);
}

/** The rows go; the sweep deletes their objects once no row names them. Pictures of log entries stay with the entry. */
export async function deleteFilesOf(db: Queryable, scope: InProject, unitIds: readonly string[]): Promise<void> {
  await db.execute(sql`delete from attachments a where ${filesOf(scope, unitIds)}`);
}
