import { writeFileSync } from "node:fs";
import { join } from "node:path";
import { prepareDatabase } from "./demo/seed-once";
import { freePort } from "./processes/free-port";
import { stopOnSignals } from "./processes/stop-on-signals";
import { waitForHttp } from "./processes/wait-until";
import { nextCommand, root, runScript } from "./run-typescript";
import { startServices, type Services } from "./services";
import { startWorker } from "./start-app";

/*
 * npm run dev -- [--port 4310] [--data dev] [--seed] [--services-only]
 * Services in .data/<data>, `next dev` and the worker, until Ctrl-C. A second stack beside the first wants a --data of
 * its own and NEXT_DIST_DIR (one `next dev` a build folder).
 */
const ports = { objectStore: 4311, mailService: 4312, mailSink: 4313, smtp: 4314, postgres: 4315 };

function option(name: string, fallback: string): string {
  const at = process.argv.indexOf(`--${name}`);
  return (at < 0 ? undefined : process.argv[at + 1]) ?? fallback;
}

const has = (name: string) => process.argv.includes(`--${name}`);
const dataDir = join(root, ".data", option("data", "dev"));

async function startDevServer(
  { supervisor, urls }: Services,
  env: Record<string, string>,
  port: number,
): Promise<void> {
  startWorker({ supervisor, env }, "development");
  const args = [nextCommand, "dev", "-p", String(port), "-H", "127.0.0.1"];
  const app = supervisor.start({ name: "app", command: process.execPath, args, cwd: root, env });
  await waitForHttp(app, `http://127.0.0.1:${port}/api/health`, 120_000, () => true);
  console.log(`\nApp    ${env["APP_URL"]}\nMail   ${urls.mailSink}\nCtrl-C stops everything.\n`);
}

let services: Services | undefined;
try {
  services = await startServices({ dataDir, ports, fsync: true, quiet: false });
  const { supervisor } = services;
  stopOnSignals(supervisor, "Stopping.");
  const port = await freePort(Number(option("port", "4310")));
  const env = { ...services.env, APP_URL: `http://localhost:${port}`, DEMO_MODE: has("seed") ? "1" : "0" };
  await (has("seed") ? prepareDatabase(env) : runScript("scripts/migrate.ts", env));
  // For other tools: everything needed to connect to the running stack.
  writeFileSync(join(dataDir, "env.json"), `${JSON.stringify(env, null, 2)}\n`, { mode: 0o600 });
  supervisor.onUnexpectedExit((child, reason) => {
    console.error(`${reason}.`);
    // The worker ends on a mistake in its code; the rest is still of use.
    if (child.name === "worker") return;
    void supervisor.stopAll().then(() => process.exit(1));
  });
  if (has("services-only")) console.log("Services are up; Ctrl-C stops them.");
  else await startDevServer(services, env, port);
} catch (error) {
  console.error(error instanceof Error ? error.message : error);
  await services?.stop();
  process.exit(1);
}
