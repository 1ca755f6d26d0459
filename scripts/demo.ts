import { join } from "node:path";
import { buildWhenChanged } from "./demo/build-when-changed";
import { keepRunning } from "./demo/keep-running";
import { printWelcome } from "./demo/print-welcome";
import { prepareDatabase } from "./demo/seed-once";
import { freePort } from "./processes/free-port";
import { stopOnSignals } from "./processes/stop-on-signals";
import { root } from "./run-typescript";
import { startServices, type Services } from "./services";
import { startApp, startWorker } from "./start-app";

// npm run demo: everything on this machine, with the tide computer in it, until Ctrl-C. Data stays in .data/demo.
const dataDir = join(root, ".data", "demo");
const ports = { objectStore: 4301, mailService: 4302, mailSink: 4303, smtp: 4304, postgres: 4305 };

let services: Services | undefined;
try {
  console.log("Starting PostgreSQL, the object store and the mail sink.");
  services = await startServices({ dataDir, ports, fsync: true, quiet: true });
  const { supervisor, urls } = services;
  stopOnSignals(supervisor, "Stopping; the data stays.");
  const port = await freePort(4300);
  const env = { ...services.env, APP_URL: `http://localhost:${port}`, DEMO_MODE: "1" };

  await prepareDatabase(env);
  await buildWhenChanged(dataDir, env);
  startWorker({ supervisor, env });
  await startApp({ supervisor, env, port });

  keepRunning(supervisor);
  await printWelcome({ app: env.APP_URL, mail: urls.mailSink, logs: join(dataDir, "log") });
} catch (error) {
  console.error(error instanceof Error ? error.message : error);
  await services?.stop();
  process.exit(1);
}
