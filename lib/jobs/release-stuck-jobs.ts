import { sql } from "drizzle-orm";
import { database } from "@/db/client";
import { log } from "@/lib/http/log";

/** No job of ours takes nearly as long. The queue itself would wait four hours. */
const MINUTES = 15;

/** Gives back the jobs of workers that were killed, so that another worker takes them. */
export async function releaseStuckJobs(): Promise<void> {
  const rows = await database().execute<{ worker: string }>(sql`
    select distinct locked_by as worker from graphile_worker.jobs
    where locked_at < now() - make_interval(mins => ${MINUTES})`);
  if (rows.length === 0) return;
  const workers = JSON.stringify(rows.map((row) => row.worker));
  await database().execute(sql`
    select graphile_worker.force_unlock_workers(array(select json_array_elements_text(${workers}::json)))`);
  log().warn({ workers: rows.length }, "gave back the jobs of workers that are gone");
}
