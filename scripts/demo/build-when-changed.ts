import { existsSync, readFileSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { keepingFiles } from "../keeping-files";
import { runToEnd } from "../processes/run-to-end";
import { nextCommand, root } from "../run-typescript";
import { sourceHash } from "./source-hash";

/** The build's own id is part of the stamp: a build made by hand in between is not taken for ours. */
function stampOf(hash: string): string | undefined {
  const id = join(root, ".next/BUILD_ID");
  return existsSync(id) ? `${hash} ${readFileSync(id, "utf8").trim()}` : undefined;
}

/** Builds the app for production unless the last build is of the same sources. */
export async function buildWhenChanged(dataDir: string, env: Record<string, string>): Promise<void> {
  const file = join(dataDir, "build-stamp");
  const hash = sourceHash();
  const last = existsSync(file) ? readFileSync(file, "utf8") : undefined;
  if (last !== undefined && last === stampOf(hash)) return;
  console.log("Building the app: about a minute, and only when sources changed.");
  const ran = await keepingFiles(["tsconfig.json"], () => {
    return runToEnd(process.execPath, [nextCommand, "build"], { cwd: root, env: { ...env, NODE_ENV: "production" } });
  });
  if (ran.code !== 0) throw new Error(`The build failed:\n${ran.output}`);
  writeFileSync(file, stampOf(hash) ?? "");
}
