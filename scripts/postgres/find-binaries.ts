import { execFileSync } from "node:child_process";
import { existsSync, readdirSync } from "node:fs";
import { join } from "node:path";

export type Binaries = { folder: string; major: number };

const oldestMajor = 15;
const debianRoot = "/usr/lib/postgresql";

function ask(command: string, args: string[]): string {
  try {
    return execFileSync(command, args, { encoding: "utf8", stdio: ["ignore", "pipe", "ignore"] }).trim();
  } catch {
    return "";
  }
}

function candidates(): string[] {
  const debian = existsSync(debianRoot)
    ? readdirSync(debianRoot).map((version) => join(debianRoot, version, "bin"))
    : [];
  return [process.env["POSTGRES_BIN"] ?? "", ...debian, ask("pg_config", ["--bindir"])].filter(
    (folder) => folder !== "",
  );
}

function inspect(folder: string): Binaries[] {
  if (!existsSync(join(folder, "initdb")) || !existsSync(join(folder, "postgres"))) return [];
  const major = Number(/(\d+)/.exec(ask(join(folder, "postgres"), ["--version"]))?.[1] ?? 0);
  return major >= oldestMajor ? [{ folder, major }] : [];
}

/** Every usable PostgreSQL (15 or later) on this machine, the newest first. */
export function findBinaries(): Binaries[] {
  return [...new Set(candidates())].flatMap(inspect).sort((one, other) => other.major - one.major);
}
