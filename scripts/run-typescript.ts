import { join, resolve } from "node:path";
import { runToEnd } from "./processes/run-to-end";

export const root = resolve(import.meta.dirname, "..");

/** The arguments that make Node.js run one of the project's TypeScript files. */
export const typescript = (file: string) => ["--import", "tsx", join(root, file)];

export const nextCommand = join(root, "node_modules/next/dist/bin/next");

/** Runs a script of the project with the services' environment; throws, with what it printed, when it fails. */
export async function runScript(file: string, env: Record<string, string>): Promise<void> {
  const ran = await runToEnd(process.execPath, typescript(file), { cwd: root, env });
  if (ran.code !== 0) throw new Error(`${file} failed:\n${ran.output}`);
}
