import { Logger, run } from "graphile-worker";
import { env } from "@/lib/env";
import { log } from "@/lib/http/log";
import { CRON, TASKS } from "./tasks";
import { WORKER_NAME } from "./worker-name";

const LEVELS = { error: "error", warning: "warn", info: "info", debug: "debug" } as const;

/** The queue's own lines as lines of our log. Its metadata is left out: it may carry a whole job. */
const logger = new Logger((scope) => (level, message) => {
  log()[LEVELS[level]]({ job: scope.jobId, task: scope.taskIdentifier }, message);
});

/** Starts taking jobs. Several workers may run on one database; each job and each cron line is taken by one of them. */
export async function startWorker() {
  const url = new URL(env().DATABASE_URL);
  url.searchParams.set("application_name", WORKER_NAME);
  const runner = await run({
    connectionString: url.href,
    concurrency: 3,
    maxPoolSize: 6,
    pollInterval: 2_000,
    noHandleSignals: true,
    logger,
    taskList: TASKS,
    crontab: CRON,
  });
  log().info("the worker takes jobs");
  return runner;
}
