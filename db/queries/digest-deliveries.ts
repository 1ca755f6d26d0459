import { sql } from "drizzle-orm";
import type { Queryable } from "@/db/client";
import type { QuietWeek } from "@/db/schema/projects";

type InProject = { projectId: string };
type Instants<Row> = { [Key in keyof Row]: Row[Key] extends Date | null ? number | Exclude<Row[Key], Date> : Row[Key] };

/** An instant as JavaScript counts it, for rows that are not read through a table. */
const ms = (column: ReturnType<typeof sql>) => sql`(extract(epoch from ${column}) * 1000)::float8`;

/** May get digests: a member of a running project whose address is confirmed and takes mail. */
const gets = sql`(m.user_id is not null and p.archived_at is null and u.email_verified is not null
  and u.mail_bounced_at is null)`;
const people = sql`join users u on u.id = s.user_id join projects p on p.id = s.project_id
  left join memberships m on m.project_id = s.project_id and m.user_id = s.user_id`;

/** Enqueues one job for each project with a digest that is due, or that a worker left behind. One query. */
export async function enqueueDueProjects(db: Queryable, now: Date): Promise<void> {
  await db.execute(sql`
    select graphile_worker.add_job('send-project-digests', payload => json_build_object('projectId', due.project_id),
      job_key => 'digests-' || due.project_id, max_attempts => 5)
    from (
      select project_id from digest_subscriptions where enabled and next_due_at <= ${now.toISOString()}
      union select project_id from digest_deliveries where state = 'claimed' and next_try_at <= now()) due`);
}

type Due = { id: string; weekday: number; hour: number; zone: string; due: Date; last: Date | null; gets: boolean };

/** Due subscriptions of a project, locked; those that another worker has just locked are left to it. */
export async function lockDueSubscriptions(db: Queryable, { projectId }: InProject, now: Date): Promise<Due[]> {
  const rows = await db.execute<Instants<Due>>(sql`
    select s.id, s.weekday, s.hour, s.zone, ${ms(sql`s.next_due_at`)} as due, ${ms(sql`l.until`)} as last, ${gets} as gets
    from digest_subscriptions s ${people}
    left join lateral (select max(d.until) as until from digest_deliveries d
      where d.subscription_id = s.id and d.state <> 'failed') l on true
    where s.project_id = ${projectId} and s.enabled and s.next_due_at <= ${now.toISOString()}
    for update of s skip locked`);
  return rows.map((row) => ({ ...row, due: new Date(row.due), last: row.last === null ? null : new Date(row.last) }));
}

type Claim = { id: string; due: Date; next: Date; since: Date; until: Date; gets: boolean };

/** Moves the subscriptions on and keeps one delivery for each that gets one, in one statement. */
export async function claimDeliveries(db: Queryable, { projectId }: InProject, claims: readonly Claim[]) {
  if (claims.length === 0) return;
  await db.execute(sql`
    with given as (
      select * from json_to_recordset(${JSON.stringify(claims)}::json)
        as g(id uuid, due timestamptz, next timestamptz, since timestamptz, until timestamptz, gets boolean)),
    moved as (update digest_subscriptions s set next_due_at = given.next from given where s.id = given.id)
    insert into digest_deliveries (subscription_id, project_id, due_at, since, until)
    select id, ${projectId}::uuid, due, since, until from given where gets
    on conflict do nothing`);
}

export type TakenDelivery = {
  id: string;
  subscriptionId: string;
  userId: string;
  email: string;
  zone: string;
  quietWeek: QuietWeek;
  since: Date;
  until: Date;
  createdAt: Date;
  tries: number;
  gets: boolean;
};

/** Takes the claimed deliveries of a project for some minutes: what is not settled by then, another worker may take. */
export async function takeDeliveries(
  db: Queryable,
  { projectId }: InProject,
  leaseSeconds: number,
): Promise<TakenDelivery[]> {
  const rows = await db.execute<Instants<TakenDelivery>>(sql`
    with open as (
      select id from digest_deliveries
      where project_id = ${projectId} and state = 'claimed' and next_try_at <= now() for update skip locked),
    taken as (
      update digest_deliveries d set tries = d.tries + 1, next_try_at = now() + make_interval(secs => ${leaseSeconds})
      from open where d.id = open.id returning d.*)
    select d.id, s.id as "subscriptionId", u.id as "userId", u.email, s.zone, s.quiet_week as "quietWeek", d.tries,
      ${ms(sql`d.since`)} as since, ${ms(sql`d.until`)} as until, ${ms(sql`d.created_at`)} as "createdAt",
      (s.enabled and ${gets}) as gets
    from taken d join digest_subscriptions s on s.id = d.subscription_id ${people} order by d.id`);
  return rows.map(({ since, until, createdAt, ...row }) => ({
    ...row,
    since: new Date(since),
    until: new Date(until),
    createdAt: new Date(createdAt),
  }));
}

export type Settled = {
  id: string;
  userId: string;
  state: "claimed" | "sent" | "quiet" | "failed";
  error: string | null;
  /** For what stays claimed. */
  nextTryAt: Date;
  bounced: boolean;
};

/** Writes all outcomes of a run in one statement; addresses that were refused for good get no more. */
export async function settleDeliveries(db: Queryable, outcomes: readonly Settled[]): Promise<void> {
  if (outcomes.length === 0) return;
  await db.execute(sql`
    with given as (
      select * from json_to_recordset(${JSON.stringify(outcomes)}::json)
        as g(id uuid, "userId" uuid, state text, error text, "nextTryAt" timestamptz, bounced boolean)),
    refused as (
      update users set mail_bounced_at = now() from given where users.id = given."userId" and given.bounced)
    update digest_deliveries d set state = given.state, last_error = given.error, next_try_at = given."nextTryAt",
      sent_at = case when given.state = 'sent' then now() end
    from given where d.id = given.id and d.state = 'claimed'`);
}
