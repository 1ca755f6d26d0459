import { drizzle } from "drizzle-orm/postgres-js";
import { migrate } from "drizzle-orm/postgres-js/migrator";
import { Logger, runMigrations } from "graphile-worker";
import { join } from "node:path";
import postgres from "postgres";

// npm run migrate: brings the database of DATABASE_URL to this version: the queue's tables, then ours.
const url = process.env["DATABASE_URL"];
if (!url) {
  console.error("DATABASE_URL is missing: it should be a postgres:// connection string.");
  process.exit(1);
}

/** Any number: two programs that migrate at once take turns by it. */
const turn = 4_210_317;

const client = postgres(url, { max: 1, connect_timeout: 10, onnotice: () => undefined });
try {
  await client`select pg_advisory_lock(${turn})`;
  await runMigrations({ connectionString: url, logger: new Logger(() => () => undefined) });
  await migrate(drizzle(client), { migrationsFolder: join(import.meta.dirname, "..", "db", "migrations") });
  console.log("The database is up to date.");
} catch (error) {
  console.error("Migrating failed:", error);
  process.exitCode = 1;
} finally {
  await client.end({ timeout: 5 });
}
