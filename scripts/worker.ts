import { closeDatabase } from "@/db/client";
import { env, EnvError } from "@/lib/env";

// npm run worker: thumbnails, mail, digests and sweeps. Run as many as you like on one database.
process.env["BOARDWAKE_SERVICE"] ??= "worker";

/** Jobs under way may end by themselves for so long; what is cut off then is done again by another worker. */
const GRACE_MS = 25_000;

try {
  env();
} catch (error) {
  if (!(error instanceof EnvError)) throw error;
  console.error(error.message);
  process.exit(1);
}

const { log } = await import("@/lib/http/log");
const { startWorker } = await import("@/lib/jobs/worker");
const runner = await startWorker().catch((error: unknown) => {
  log().fatal({ err: error }, "the worker could not start");
  process.exit(1);
});

let isStopping = false;
async function stop(signal: string): Promise<void> {
  if (isStopping) return;
  isStopping = true;
  log().info({ signal }, "the worker stops");
  setTimeout(() => process.exit(1), GRACE_MS).unref();
  await runner.stop();
  await closeDatabase();
  process.exit(0);
}

for (const signal of ["SIGTERM", "SIGINT", "SIGHUP"] as const) process.on(signal, () => void stop(signal));
await runner.promise;
if (!isStopping) process.exit(1);
