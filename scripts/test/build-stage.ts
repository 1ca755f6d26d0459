import { rmSync } from "node:fs";
import { join } from "node:path";
import { runToEnd } from "../processes/run-to-end";
import { nextCommand, root } from "../run-typescript";
import { keepingFiles } from "../keeping-files";
import { failedOne, passedOne, type Stage } from "./stage";

/** A build folder of the tests' own, so that a running demo keeps its build. */
export const testBuild = ".next-test";

/** The production build that the browser tests run against. Needs no secrets and no database. */
export const build: Stage = {
  name: "build",
  async run() {
    // Route types of an earlier build would be checked against sources that have moved on.
    rmSync(join(root, testBuild, "types"), { recursive: true, force: true });
    const env = { NEXT_DIST_DIR: testBuild, NODE_ENV: "production", NEXT_TELEMETRY_DISABLED: "1" };
    const ran = await keepingFiles(["tsconfig.json", "next-env.d.ts"], () => {
      return runToEnd(process.execPath, [nextCommand, "build"], { cwd: root, env });
    });
    if (ran.code === 0) return passedOne;
    console.log(`\nbuild:\n${ran.output}`);
    return failedOne();
  },
};
