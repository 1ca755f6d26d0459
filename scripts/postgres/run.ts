import { resolve } from "node:path";
import { createSupervisor } from "../processes/supervisor";
import { stopOnSignals } from "../processes/stop-on-signals";
import { startPostgres } from "./start-postgres";

// node --import tsx scripts/postgres/run.ts [data folder] [port] [--no-fsync]: PostgreSQL alone, until Ctrl-C.
const words = process.argv.slice(2).filter((word) => !word.startsWith("--"));
const dataDir = resolve(words[0] ?? ".data/postgres-only");
const port = words[1] === undefined ? undefined : Number(words[1]);

const supervisor = await createSupervisor({ dataDir, quiet: false });
stopOnSignals(supervisor, "Stopping PostgreSQL.");
supervisor.onUnexpectedExit((_, reason) => {
  console.error(reason);
  process.exit(1);
});
try {
  const { url } = await startPostgres({ supervisor, dataDir, port, fsync: !process.argv.includes("--no-fsync") });
  console.log(`DATABASE_URL=${url}`);
} catch (error) {
  console.error(error instanceof Error ? error.message : error);
  await supervisor.stopAll();
  process.exit(1);
}
