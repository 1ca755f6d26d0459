import { existsSync, mkdtempSync, readFileSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { z } from "zod";
import { runToEnd } from "../processes/run-to-end";
import { root } from "../run-typescript";
import { failedOne, type Outcome, type Stage } from "./stage";

const reportSchema = z.object({
  numPassedTests: z.number(),
  numFailedTests: z.number(),
  numPendingTests: z.number(),
  numTodoTests: z.number(),
  testResults: z.array(z.object({ status: z.string(), assertionResults: z.array(z.unknown()) })),
});

function count(file: string, code: number): Outcome {
  if (!existsSync(file)) return failedOne("no report was written");
  const report = reportSchema.parse(JSON.parse(readFileSync(file, "utf8")));
  // A file that cannot even be loaded has no tests to fail.
  const brokenFiles = report.testResults.filter(
    (one) => one.status === "failed" && one.assertionResults.length === 0,
  ).length;
  const failed = report.numFailedTests + brokenFiles;
  const hidden = code !== 0 && failed === 0 ? 1 : 0;
  const note = hidden > 0 ? "an error outside of any test" : undefined;
  return {
    passed: report.numPassedTests,
    failed: failed + hidden,
    skipped: report.numPendingTests + report.numTodoTests,
    note,
  };
}

/** One project of vitest. `show` prints as it goes; otherwise the output appears when something failed. */
export function vitestStage(name: string, env: () => Record<string, string> = () => ({}), show = false): Stage {
  return {
    name,
    async run(filters) {
      const folder = mkdtempSync(join(tmpdir(), "boardwake-test-report-"));
      const report = join(folder, "report.json");
      const reporters = ["--reporter=default", "--reporter=json", `--outputFile.json=${report}`];
      const args = [
        join(root, "node_modules/vitest/vitest.mjs"),
        "run",
        "--project",
        name,
        "--passWithNoTests",
        ...reporters,
      ];
      const ran = await runToEnd(process.execPath, [...args, ...filters], {
        cwd: root,
        env: { NO_COLOR: "1", ...env() },
        show,
      });
      const outcome = count(report, ran.code);
      rmSync(folder, { recursive: true, force: true });
      if (outcome.failed > 0 && !show) console.log(ran.output);
      return outcome;
    },
  };
}
