import { existsSync, writeFileSync } from "node:fs";
import { join, resolve } from "node:path";
import { freePort } from "./processes/free-port";
import { runToEnd } from "./processes/run-to-end";
import { stopOnSignals } from "./processes/stop-on-signals";
import { waitForHttp } from "./processes/wait-until";
import { startServices, type Services } from "./services";

// npm run dev [-- --port 4310] [-- --services-only]: services in .data/dev, next dev and the worker, until Ctrl-C.
const root = resolve(import.meta.dirname, "..");
const dataDir = join(root, ".data", "dev");
const ports = { objectStore: 4311, mailService: 4312, mailSink: 4313, smtp: 4314, postgres: 4315 };
const typescript = (file: string) => ["--import", "tsx", join(root, file)];

function wantedPort(): number {
  const at = process.argv.indexOf("--port");
  return at < 0 ? 4310 : Number(process.argv[at + 1]);
}

async function migrate(env: Record<string, string>): Promise<void> {
  const ran = await runToEnd(process.execPath, typescript("scripts/migrate.ts"), { cwd: root, env, show: true });
  if (ran.code !== 0) throw new Error("Migrating the database failed.");
}

async function startApp({ supervisor, urls }: Services, env: Record<string, string>, port: number): Promise<void> {
  if (existsSync(join(root, "scripts/worker.ts"))) {
    supervisor.start({
      name: "worker",
      command: process.execPath,
      args: typescript("scripts/worker.ts"),
      cwd: root,
      env,
    });
  }
  const next = [join(root, "node_modules/next/dist/bin/next"), "dev", "-p", String(port), "-H", "127.0.0.1"];
  const app = supervisor.start({ name: "app", command: process.execPath, args: next, cwd: root, env });
  await waitForHttp(app, `http://127.0.0.1:${port}/api/health`, 120_000, () => true);
  console.log(`\nApp        ${env["APP_URL"]}\nMail       ${urls.mailSink}\nCtrl-C stops everything.\n`);
}

let services: Services | undefined;
try {
  services = await startServices({ dataDir, ports, fsync: true, quiet: false });
  const { supervisor } = services;
  stopOnSignals(supervisor, "Stopping.");
  const port = await freePort(wantedPort());
  const env = { ...services.env, APP_URL: `http://localhost:${port}` };
  await migrate(env);
  // For other tools: everything needed to connect to the running stack.
  writeFileSync(join(dataDir, "env.json"), `${JSON.stringify(env, null, 2)}\n`, { mode: 0o600 });
  supervisor.onUnexpectedExit((child, reason) => {
    console.error(`${reason}.`);
    // The worker ends on a mistake in its code; the rest is still of use.
    if (child.name === "worker") return;
    void supervisor.stopAll().then(() => process.exit(1));
  });
  if (process.argv.includes("--services-only")) console.log("Services are up; Ctrl-C stops them.");
  else await startApp(services, env, port);
} catch (error) {
  console.error(error instanceof Error ? error.message : error);
  await services?.stop();
  process.exit(1);
}
