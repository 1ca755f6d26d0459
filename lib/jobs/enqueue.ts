import { sql } from "drizzle-orm";
import type { Queryable } from "@/db/client";
import type { JobName, JobPayload } from "./payloads";

type Options = {
  /** Same key: one job waits, a second call replaces it. */
  key?: string;
  runAt?: Date;
  maxAttempts?: number;
};

/** Enqueues in the given transaction: the job exists if and only if the change was committed. */
export async function enqueue<Name extends JobName>(
  db: Queryable,
  name: Name,
  payload: JobPayload<Name>,
  options: Options = {},
) {
  await db.execute(sql`
    select graphile_worker.add_job(
      ${name}::text,
      payload => ${JSON.stringify(payload)}::json,
      run_at => coalesce(${options.runAt?.toISOString() ?? null}::timestamptz, now()),
      max_attempts => ${options.maxAttempts ?? 10}::int,
      job_key => ${options.key ?? null}::text
    )`);
}
