import type postgres from "postgres";
import { z } from "zod";
import { startChild, type Child } from "../processes/start-child";
import { root, typescript } from "../run-typescript";
import { times, type Row } from "./row";

const PROJECTS = 200;
const MANY = 10;
const received = z.array(z.object({ to: z.array(z.string()) }));

/**
 * Weekly digests for 2,000 subscribers over 200 projects; the worker is killed once on the way. Counts the transactions
 * of the database for one and for ten subscribers a project, and the mails that arrived.
 */
export async function benchDigests(env: Record<string, string>, sql: postgres.Sql): Promise<Row[]> {
  const few = await runOnce(env, sql, "few", 1, false);
  const many = await runOnce(env, sql, "many", MANY, true);
  const growth = many.statements / few.statements;
  return [
    {
      work: `weekly digests, ${PROJECTS} projects, 10 × the subscribers: transactions`,
      ours: String(many.statements),
      floor: String(few.statements),
      ratio: times(growth),
      toReach: "with projects: 2 ×",
      reached: growth <= 2,
    },
    {
      work: `weekly digests, ${PROJECTS * MANY} subscribers, worker killed midway: sent once (${many.seconds.toFixed(0)} s)`,
      ours: String(many.once),
      floor: String(PROJECTS * MANY),
      ratio: times(many.mails / (PROJECTS * MANY)),
      toReach: "each once",
      reached: many.once === PROJECTS * MANY && many.mails === PROJECTS * MANY,
    },
  ];
}

type Ran = { statements: number; mails: number; once: number; seconds: number };

async function runOnce(
  env: Record<string, string>,
  sql: postgres.Sql,
  name: string,
  each: number,
  kill: boolean,
): Promise<Ran> {
  await sql`update digest_subscriptions set enabled = false`;
  await sql`
    with made as (
      insert into projects (slug, name) select ${`digest-${name}-`} || n, 'Digest ' || n from generate_series(1, ${PROJECTS}) n returning id, slug
    ), people as (
      insert into users (name, email, email_verified)
      select 'Reader', slug || '-' || m || '@digest.example', now() from made, generate_series(1, ${each}) m returning id, email
    ), joined as (
      insert into memberships (project_id, user_id, role)
      select made.id, people.id, 'collaborator' from people join made on people.email like made.slug || '-%' and people.email ~ ('^' || made.slug || '-[0-9]+@') returning project_id, user_id
    )
    insert into digest_subscriptions (project_id, user_id, zone, next_due_at) select project_id, user_id, 'UTC', now() - interval '1 hour' from joined`;
  await sql`insert into log_entries (id, project_id, title) select gen_random_uuid(), id, 'Entry' from projects where slug like ${`digest-${name}-%`}`;
  await sql`insert into events (project_id, kind, subject_id, payload, created_at)
    select project_id, 'log.written', id, '{"title":"Entry"}', now() - interval '2 hours' from log_entries where title = 'Entry'`;
  await fetch(`${env["FAKE_MAIL_SINK_URL"]}/api/messages`, { method: "DELETE" });
  const before = await statements(sql);
  const start = performance.now();
  let worker = startWorker(env);
  await sql`select graphile_worker.add_job('find-due-digests', '{}'::json)`;
  if (kill) {
    await until(async () => (await open(sql, name)) < (PROJECTS * each) / 2);
    worker.kill();
    worker = startWorker(env);
    // As if the leases of the killed worker had run out, so that the bench need not wait for it.
    await sql`update digest_deliveries set next_try_at = now() where state = 'claimed'`;
    await sql`select graphile_worker.force_unlock_workers(array(select distinct locked_by from graphile_worker.jobs where locked_by is not null))`;
    await sql`select graphile_worker.add_job('find-due-digests', '{}'::json)`;
  }
  await until(async () => (await open(sql, name)) === 0);
  const seconds = (performance.now() - start) / 1000;
  const after = await statements(sql);
  await worker.stop();
  const expected = PROJECTS * each;
  let mails: string[] = [];
  await until(async () => {
    mails = await receivedBy(env);
    return mails.length >= expected;
  });
  const counts = new Map<string, number>();
  for (const address of mails) counts.set(address, (counts.get(address) ?? 0) + 1);
  const once = [...counts.values()].filter((count) => count === 1).length;
  return { statements: after - before, mails: mails.length, once, seconds };
}

function startWorker(env: Record<string, string>): Child {
  return startChild({
    name: "worker",
    command: process.execPath,
    args: typescript("scripts/worker.ts"),
    cwd: root,
    env: { ...env, NODE_ENV: "production" },
  });
}

async function receivedBy(env: Record<string, string>): Promise<string[]> {
  const response = await fetch(`${env["FAKE_MAIL_SINK_URL"]}/api/messages`);
  return received.parse(await response.json()).flatMap((message) => message.to);
}

/** Subscribers of this run that have not got their digest yet. */
async function open(sql: postgres.Sql, name: string): Promise<number> {
  const [row] = await sql<{ open: number }[]>`
    select count(*)::int as open from digest_subscriptions s join projects p on p.id = s.project_id
    where p.slug like ${`digest-${name}-%`}
      and not exists (select from digest_deliveries d where d.subscription_id = s.id and d.state in ('sent', 'quiet'))`;
  return row?.open ?? Number.NaN;
}

/** Transactions so far; a statement outside of a transaction is one of its own. */
async function statements(sql: postgres.Sql): Promise<number> {
  const [row] = await sql<{ count: number }[]>`
    select (xact_commit + xact_rollback)::int as count from pg_stat_database where datname = current_database()`;
  return row?.count ?? Number.NaN;
}

async function until(isSo: () => Promise<boolean>): Promise<void> {
  const deadline = Date.now() + 240_000;
  while (!(await isSo())) {
    if (Date.now() > deadline) throw new Error("the digests did not go out in time");
    await new Promise((resolve) => setTimeout(resolve, 500));
  }
}
