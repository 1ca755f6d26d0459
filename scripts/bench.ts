import { existsSync } from "node:fs";
import { join } from "node:path";
import postgres from "postgres";
import { benchPageScript } from "./bench/bench-page-script";
import { benchContinuity } from "./bench/continuity";
import { benchDigests } from "./bench/digests";
import { benchRackPage } from "./bench/rack-page";
import { benchRecordAttempt } from "./bench/record-attempt";
import { printTable, type Row } from "./bench/row";
import { benchRules } from "./bench/rules";
import { freePort } from "./processes/free-port";
import { stopOnSignals } from "./processes/stop-on-signals";
import { root } from "./run-typescript";
import { startApp } from "./start-app";
import { build, testBuild } from "./test/build-stage";
import { freshEnvironment, startThrowAwayServices } from "./test/throw-away-services";

/*
 * npm run bench              every figure
 * npm run bench -- record    only the ones whose name contains the word
 * Figures are ratios measured side by side in one run on this machine.
 */
const SESSION_COOKIE = "authjs.session-token";
const wanted = process.argv.slice(2);
const isWanted = (name: string) => wanted.length === 0 || wanted.some((word) => name.includes(word));

const rows: Row[] = [];
if (isWanted("rules")) rows.push(...benchRules());
if (isWanted("continuity")) rows.push(...benchContinuity());
if (["record", "rack", "script", "digest"].some(isWanted)) await benchServed();
printTable(rows);
process.exit(rows.every((row) => row.reached) ? 0 : 1);

/** The figures that need the app, its worker and a database. */
async function benchServed(): Promise<void> {
  const services = await startThrowAwayServices();
  stopOnSignals({ ...services.supervisor, stopAll: services.stop }, "Stopping the bench.");
  try {
    if (!existsSync(join(root, testBuild, "BUILD_ID")) && (await build.run([])).failed > 0) throw new Error("no build");
    const fresh = await freshEnvironment(services, "bench");
    const port = await freePort();
    const app = `http://localhost:${port}`;
    const env = { ...fresh, NEXT_DIST_DIR: testBuild, APP_URL: app };
    await startApp({ supervisor: services.supervisor, env, port });
    const sql = postgres(fresh["DATABASE_URL"] ?? "", { max: 10, onnotice: () => undefined });
    if (isWanted("record")) rows.push(...(await benchRecordAttempt(app, SESSION_COOKIE, sql)));
    if (isWanted("rack")) rows.push(...(await benchRackPage(app, SESSION_COOKIE, sql)));
    if (isWanted("script")) rows.push(...(await benchPageScript(app, SESSION_COOKIE, sql)));
    if (isWanted("digest")) rows.push(...(await benchDigests(env, sql)));
    await sql.end({ timeout: 5 });
  } finally {
    await services.stop();
  }
}
