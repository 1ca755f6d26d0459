import { existsSync } from "node:fs";
import { join } from "node:path";
import { runToEnd } from "../processes/run-to-end";
import { nextCommand, root } from "../run-typescript";
import { keepingFiles } from "../keeping-files";
import { failedOne, passedOne, type Stage } from "./stage";

/** A tool that passes or fails as a whole; its output is shown when it fails. */
function tool(name: string, file: string, args: string[], before?: () => Promise<void>): Stage {
  return {
    name,
    async run() {
      await before?.();
      const ran = await runToEnd(process.execPath, [join(root, "node_modules", file), ...args], { cwd: root });
      if (ran.code === 0) return passedOne;
      console.log(`\n${name}:\n${ran.output}`);
      return failedOne();
    },
  };
}

/** A fresh checkout has none of the declarations that Next.js generates. */
async function generateTypes(): Promise<void> {
  if (existsSync(join(root, "next-env.d.ts"))) return;
  await keepingFiles(["tsconfig.json"], () => runToEnd(process.execPath, [nextCommand, "typegen"], { cwd: root }));
}

export const lint = tool("lint", "eslint/bin/eslint.js", [".", "--max-warnings=0"]);
export const types = tool("types", "typescript/bin/tsc", ["--noEmit"], generateTypes);
export const format = tool("format", "prettier/bin/prettier.cjs", ["--check", "--log-level=warn", "."]);
export const unused = tool("knip", "knip/bin/knip.js", []);
