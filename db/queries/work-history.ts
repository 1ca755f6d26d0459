import { sql } from "drizzle-orm";
import type { Queryable } from "@/db/client";
import { attempts, attemptVoids } from "@/db/schema/travelers";
import { events } from "@/db/schema/events";
import { benchSessions } from "@/db/schema/order";

/** Longer without an attempt: the builder has left the bench, s. */
export const SESSION_GAP_S = 90 * 60;

/** What a change did to whether a check holds; the instant in ms since 1970, the check as a number within this answer. */
type Turn = [
  atMs: number,
  check: number,
  what: "conforms" | "does-not-conform" | "conceded" | "doubtful" | "reopened" | "withdrawn",
];

export type WorkHistory = {
  /** Only what changed whether a check holds, and the first of each check, in order of time. */
  turns: Turn[];
  /** A builder's attempts that lie close together: builder, first and last of them in ms. */
  visits: [builder: string, startMs: number, endMs: number][];
  /** Sessions started by hand; not stopped yet: null. */
  typed: [builder: string, startMs: number, endMs: number | null][];
};

const inMs = (instant: unknown) => sql`(extract(epoch from ${instant}) * 1000)::int8`;

/** The whole history of a project's work as one value, so that it rides along with another query. */
export const workHistory = (projectId: string) => sql<WorkHistory>`(
  with done as (
    select ${inMs(sql`a.performed_at`)} as ms, a.check_id, coalesce(a.user_id::text, '') as builder, a.arrival,
      case when a.verdict = 'does-not-conform' then 'does-not-conform' else 'conforms' end as what
    from ${attempts} a
    where a.project_id = ${projectId} and not exists (select 1 from ${attemptVoids} v where v.attempt_id = a.id)
  ), happened as (
    select ms, check_id, what, arrival from done
    union all
    select ${inMs(sql`e.created_at`)}, e.check_id, case e.kind when 'check.doubted' then 'doubtful'
      when 'check.reopened' then 'reopened' when 'concession.granted' then 'conceded' else 'withdrawn' end, null
    from ${events} e
    where e.project_id = ${projectId} and e.check_id is not null
      and e.kind in ('check.doubted', 'check.reopened', 'concession.granted', 'concession.withdrawn')
  ), turned as (
    select ms, check_id, what, lag(what in ('conforms', 'conceded')) over (partition by check_id order by ms, arrival) as before
    from happened
  ), turns as (
    select ms, what, dense_rank() over (order by check_id) as number from turned
    where before is distinct from (what in ('conforms', 'conceded'))
  ), gaps as (
    select builder, ms, ms - lag(ms) over (partition by builder order by ms) > ${SESSION_GAP_S * 1000} as is_new from done
  ), numbered as (
    select builder, ms, count(*) filter (where is_new) over (partition by builder order by ms) as visit from gaps
  ), visits as (
    select builder, min(ms) as first, max(ms) as last from numbered group by builder, visit
  )
  select json_build_object(
    'turns', (select coalesce(json_agg(json_build_array(ms, number, what) order by ms), '[]') from turns),
    'visits', (select coalesce(json_agg(json_build_array(builder, first, last) order by first), '[]') from visits),
    'typed', (select coalesce(json_agg(json_build_array(s.user_id, ${inMs(sql`s.started_at`)}, ${inMs(sql`s.ended_at`)})
      order by s.started_at), '[]') from ${benchSessions} s where s.project_id = ${projectId})))`;

export async function findWorkHistory(db: Queryable, scope: { projectId: string }): Promise<WorkHistory> {
  const [row] = await db.execute<{ history: WorkHistory }>(sql`select ${workHistory(scope.projectId)} as history`);
  return row?.history ?? { turns: [], visits: [], typed: [] };
}
