import { sql } from "drizzle-orm";
import { database } from "@/db/client";
import { WORKER_NAME } from "@/lib/jobs/worker-name";
import { log } from "@/lib/http/log";
import { listObjects } from "@/lib/storage/object-store";
import packageFile from "@/package.json";

const WAIT_MS = 3_000;

type Part = { status: "up" } | { status: "down" };
type Queue =
  /** Jobs whose time has come and that nobody has taken yet, and for how long the oldest waits. */
  { status: "up" | "no-worker"; waiting: number; oldestWaitSeconds: number; failed: number } | { status: "down" };

export type Health = {
  /** degraded: pages work, mail and thumbnails wait. */
  status: "up" | "degraded" | "down";
  version: string;
  database: Part;
  queue: Queue;
  objectStore: Part;
};

/** How everything that we rest on is, each asked with a time limit. Says nothing that helps to get in. */
export async function checkHealth(waitMs = WAIT_MS): Promise<Health> {
  const [databasePart, queue, objectStore] = await Promise.all([
    ask("database", waitMs, askDatabase),
    ask("queue", waitMs, askQueue),
    ask("object store", waitMs, askObjectStore),
  ]);
  const isDown = databasePart.status === "down" || objectStore.status === "down";
  return {
    status: isDown ? "down" : queue.status === "up" ? "up" : "degraded",
    version: packageFile.version,
    database: databasePart,
    queue,
    objectStore,
  };
}

async function ask<Answer>(
  what: string,
  waitMs: number,
  question: () => Promise<Answer>,
): Promise<Answer | { status: "down" }> {
  let timer: NodeJS.Timeout | undefined;
  const late = new Promise<never>((_, reject) => {
    timer = setTimeout(() => reject(new Error(`no answer within ${waitMs} ms`)), waitMs);
  });
  try {
    return await Promise.race([question(), late]);
  } catch (error) {
    log().warn({ what, reason: error instanceof Error ? error.message : String(error) }, "not healthy");
    return { status: "down" };
  } finally {
    clearTimeout(timer);
  }
}

async function askDatabase(): Promise<Part> {
  await database().execute(sql`select 1`);
  return { status: "up" };
}

async function askQueue(): Promise<Queue> {
  const [row] = await database().execute<{ worker: boolean; waiting: number; oldest: number; failed: number }>(sql`
    select
      exists (select 1 from pg_stat_activity
        where datname = current_database() and application_name = ${WORKER_NAME}) as worker,
      count(*) filter (where is_due)::int as waiting,
      coalesce(max(extract(epoch from now() - run_at)) filter (where is_due), 0)::int as oldest,
      count(*) filter (where attempts >= max_attempts)::int as failed
    from (select run_at, attempts, max_attempts, run_at <= now() and locked_at is null and attempts < max_attempts as is_due
      from graphile_worker.jobs) jobs`);
  if (!row) throw new Error("an aggregate without grouping keys gave no row");
  const { worker, waiting, oldest, failed } = row;
  return {
    status: worker ? "up" : "no-worker",
    waiting,
    oldestWaitSeconds: oldest,
    failed,
  };
}

async function askObjectStore(): Promise<Part> {
  await listObjects(0, 1);
  return { status: "up" };
}
