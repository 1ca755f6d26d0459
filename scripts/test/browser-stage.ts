import { existsSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { z } from "zod";
import { installDebianPackage } from "../install/install-debian-package";
import { freePort } from "../processes/free-port";
import { runToEnd } from "../processes/run-to-end";
import { root, runScript } from "../run-typescript";
import { startApp, startWorker } from "../start-app";
import { testBuild } from "./build-stage";
import { failedOne, notRun, type Outcome, type Stage } from "./stage";
import { freshEnvironment, type ThrowAway } from "./throw-away-services";

const statsSchema = z.object({
  stats: z.object({ expected: z.number(), unexpected: z.number(), flaky: z.number(), skipped: z.number() }),
});

async function chromium(): Promise<string> {
  const path = process.env["CHROMIUM_PATH"] ?? "/usr/bin/chromium";
  if (!existsSync(path)) await installDebianPackage("chromium", "Chromium");
  if (!existsSync(path)) throw new Error(`There is no Chromium at ${path}. Set CHROMIUM_PATH to one.`);
  return path;
}

/** Two apps and a worker on one seeded database: no state may live in a process. */
async function startStack(services: ThrowAway): Promise<Record<string, string>> {
  const { supervisor } = services;
  const [first, second] = [await freePort(), await freePort()];
  const fresh = await freshEnvironment(services, "browser");
  const address = (port: number) => `http://localhost:${port}`;
  const env = {
    ...fresh,
    NEXT_DIST_DIR: testBuild,
    DEMO_MODE: "1",
    APP_URL: address(first),
    SECOND_APP_URL: address(second),
  };
  if (existsSync(join(root, "db/seed/run.ts"))) await runScript("db/seed/run.ts", env);
  startWorker({ supervisor, env });
  await startApp({ supervisor, env, port: first });
  await startApp({ supervisor, env: { ...env, APP_URL: env.SECOND_APP_URL }, port: second, name: "second-app" });
  return env;
}

function count(file: string): Outcome {
  if (!existsSync(file)) return failedOne("no report was written");
  const { stats } = statsSchema.parse(JSON.parse(readFileSync(file, "utf8")));
  // A test that passes only sometimes has failed.
  return { passed: stats.expected, failed: stats.unexpected + stats.flaky, skipped: stats.skipped };
}

/** The journeys in Chromium against the production build. */
export function browserStage(services: ThrowAway): Stage {
  return {
    name: "browser",
    async run(filters) {
      if (!existsSync(join(root, "playwright.config.ts"))) return notRun("there is no playwright.config.ts");
      if (!existsSync(join(root, testBuild, "BUILD_ID"))) return notRun("there is no build");
      const executable = await chromium();
      const env = await startStack(services);
      const report = join(services.folder, "browser-report.json");
      const reporting = { CHROMIUM_PATH: executable, PLAYWRIGHT_JSON_OUTPUT_FILE: report };
      const args = [
        join(root, "node_modules/@playwright/test/cli.js"),
        "test",
        "--reporter=list,json",
        "--pass-with-no-tests",
        ...filters,
      ];
      const ran = await runToEnd(process.execPath, args, { cwd: root, env: { ...env, ...reporting }, show: true });
      const outcome = count(report);
      const isHidden = ran.code !== 0 && outcome.failed === 0;
      return isHidden ? { ...outcome, failed: 1, note: "an error outside of any test" } : outcome;
    },
  };
}
