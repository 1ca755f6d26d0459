import { spawn, type ChildProcess } from "node:child_process";
import { sql } from "drizzle-orm";
import { database } from "@/db/client";

export type Worker = { process: ChildProcess; lines: string[]; ended: Promise<number | null> };

/** A worker process of its own, as it runs for real. */
export function startWorkerProcess(): Worker {
  const child = spawn(process.execPath, ["--import", "tsx", "scripts/worker.ts"], {
    env: { ...process.env, LOG_LEVEL: "info" },
    stdio: ["ignore", "pipe", "pipe"],
  });
  const lines: string[] = [];
  for (const stream of [child.stdout, child.stderr]) stream.on("data", (data: Buffer) => lines.push(String(data)));
  const ended = new Promise<number | null>((resolve) => child.once("exit", (code) => resolve(code)));
  return { process: child, lines, ended };
}

/** As if the queue had waited until it was sure that the workers are gone. */
export async function releaseJobsOfTheDead(): Promise<void> {
  await database().execute(sql`
    select graphile_worker.force_unlock_workers(array(
      select distinct locked_by from graphile_worker.jobs where locked_by is not null))`);
}

export async function jobsLike(name: string) {
  return database().execute<{ id: string; attempts: number; last_error: string | null; run_at: string }>(sql`
    select id, attempts, last_error, run_at from graphile_worker.jobs where task_identifier = ${name} order by id`);
}
