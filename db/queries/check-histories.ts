import { sql } from "drizzle-orm";
import type { Queryable } from "@/db/client";
import type { Stage } from "@/db/schema/procedures";
import type { CheckState, Verdict } from "@/db/schema/travelers";

export type CheckHistoryRow = {
  id: string;
  unit_id: string;
  serial: string;
  stage: Stage;
  title: string;
  position: number;
  hold_point: boolean;
  lifted: boolean;
  needs: string[];
  last_id: string | null;
  last_arrival: number | null;
  last_verdict: Verdict | null;
  failed_arrival: number | null;
  reopened_after: number | null;
  reopened_reason: string | null;
  reworked_after: number | null;
  reworked_reason: string | null;
  /** Reason of the standing concession for the last valid attempt. */
  conceded_reason: string | null;
  /** The cached columns, to be compared with what history says. */
  state: CheckState;
  state_reason: string;
  inside_guard_band: boolean;
  last_attempt_id: string | null;
  /** False for rows that are here only because others depend on them. */
  affected: boolean;
};

/** Units whose checks depend on checks of the given units, through any number of units, and the given ones. */
export const affectedUnits = (projectId: string, unitIds: readonly string[]) => sql`
  affected(unit_id) as (
    select id from units where project_id = ${projectId} and id in (select value::uuid from json_array_elements_text(${JSON.stringify(unitIds)}::json))
    union
    select waiting.unit_id from affected
      join checks needed on needed.unit_id = affected.unit_id and needed.retired_at is null
      join check_prerequisites edge on edge.needs_check_id = needed.id
      join checks waiting on waiting.id = edge.check_id and waiting.retired_at is null
  )`;

/**
 * Everything the states of the affected units' checks depend on, one row a check, in one query whatever the size:
 * the affected units and, transitively, the units that these depend on.
 */
export async function findCheckHistories(
  db: Queryable,
  projectId: string,
  unitIds: readonly string[],
): Promise<CheckHistoryRow[]> {
  return await db.execute<CheckHistoryRow>(sql`
    with recursive ${affectedUnits(projectId, unitIds)},
    relevant(unit_id) as (
      select unit_id from affected
      union
      select needed.unit_id from relevant
        join checks waiting on waiting.unit_id = relevant.unit_id and waiting.retired_at is null
        join check_prerequisites edge on edge.check_id = waiting.id
        join checks needed on needed.id = edge.needs_check_id and needed.retired_at is null
    )
    select c.id, c.unit_id, units.serial, c.stage, procedure_checks.title, c.position, c.hold_point,
      exists (select 1 from hold_lifts where hold_lifts.check_id = c.id) as lifted,
      (select coalesce(json_agg(edge.needs_check_id), '[]') from check_prerequisites edge where edge.check_id = c.id) as needs,
      last.id as last_id, last.arrival::float8 as last_arrival, last.verdict as last_verdict,
      (select max(a.arrival)::float8 from attempts a
        where a.check_id = c.id and a.verdict = 'does-not-conform'
          and not exists (select 1 from attempt_voids v where v.attempt_id = a.id)) as failed_arrival,
      reopened.after_arrival::float8 as reopened_after, reopened.reason as reopened_reason,
      reworked.after_arrival::float8 as reworked_after, reworked.reason as reworked_reason,
      (select concessions.reason from concessions
        where concessions.check_id = c.id and concessions.attempt_id = last.id and concessions.withdrawn_at is null
        order by concessions.created_at desc, concessions.id limit 1) as conceded_reason,
      c.state, c.state_reason, c.inside_guard_band, c.last_attempt_id,
      c.unit_id in (select unit_id from affected) as affected
    from checks c
    join units on units.id = c.unit_id
    join procedure_checks on procedure_checks.id = c.procedure_check_id
    left join lateral (
      select a.id, a.arrival, a.verdict from attempts a
      where a.check_id = c.id and not exists (select 1 from attempt_voids v where v.attempt_id = a.id)
      order by a.arrival desc limit 1) last on true
    left join lateral (
      select r.after_arrival, r.reason from reopenings r
      where r.check_id = c.id order by r.after_arrival desc, r.created_at desc, r.id limit 1) reopened on true
    left join lateral (
      select d.after_arrival, d.reason from rework_doubts d
      join reworks on reworks.id = d.rework_id
      where d.check_id = c.id and d.origin <> 'spared'
      order by d.after_arrival desc, reworks.arrival desc limit 1) reworked on true
    where c.unit_id in (select unit_id from relevant) and c.retired_at is null`);
}
