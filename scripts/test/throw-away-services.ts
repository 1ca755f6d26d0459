import { chmodSync, existsSync, mkdtempSync, readdirSync, rmSync, statSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import postgres from "postgres";
import { endLeftovers, isClaimed } from "../processes/pid-file";
import { runScript } from "../run-typescript";
import { startServices, type Services } from "../services";

const prefix = "boardwake-test-";
const hour = 3_600_000;

/** Ends and removes what killed runs left: their folders name their processes. */
async function sweep(): Promise<void> {
  for (const name of readdirSync(tmpdir()).filter((one) => one.startsWith(prefix))) {
    const folder = join(tmpdir(), name);
    const pidFile = join(folder, "processes.json");
    try {
      const isFresh = !existsSync(pidFile) && Date.now() - statSync(folder).mtimeMs < hour;
      if (isFresh || isClaimed(pidFile)) continue;
      await endLeftovers(pidFile);
      rmSync(folder, { recursive: true, force: true });
    } catch {
      // Another user's, or another run is sweeping it.
    }
  }
}

export type ThrowAway = Services & { folder: string };

/** PostgreSQL and fakes on free ports in a temporary folder; nothing of the demo is touched. */
export async function startThrowAwayServices(): Promise<ThrowAway> {
  await sweep();
  const folder = mkdtempSync(join(tmpdir(), prefix));
  // PostgreSQL runs as another user when we are root and has to pass through.
  chmodSync(folder, 0o711);
  const services = await startServices({ dataDir: folder, fsync: false, quiet: true });
  const env = { ...services.env, LOG_LEVEL: "warn" };
  return {
    ...services,
    env,
    folder,
    async stop() {
      await services.stop();
      rmSync(folder, { recursive: true, force: true });
    },
  };
}

/** A migrated database of its own in the same server, and the fakes emptied: stages do not see each other's data. */
export async function freshEnvironment({ env }: ThrowAway, name: string): Promise<Record<string, string>> {
  const url = new URL(env["DATABASE_URL"] ?? "");
  const sql = postgres(url.href, { max: 1, onnotice: () => undefined });
  await sql`create database ${sql(`boardwake_${name}`)}`.finally(() => sql.end({ timeout: 5 }));
  url.pathname = `/boardwake_${name}`;
  const fakes = ["FAKE_OBJECT_STORE_URL", "FAKE_MAIL_SERVICE_URL", "FAKE_MAIL_SINK_URL"];
  for (const fake of fakes) await fetch(`${env[fake]}/__fake/clear`, { method: "POST" });
  const fresh = { ...env, DATABASE_URL: url.href };
  await runScript("scripts/migrate.ts", fresh);
  return fresh;
}
