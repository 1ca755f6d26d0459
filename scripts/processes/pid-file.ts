import { existsSync, mkdirSync, readFileSync, renameSync, rmSync, writeFileSync } from "node:fs";
import { dirname } from "node:path";
import { z } from "zod";
import { endProcess } from "./end-process";
import { identify, isStillRunning } from "./identity";

const identity = z.object({ pid: z.number().int().positive(), started: z.string(), command: z.string() });
const child = identity.extend({ name: z.string(), stopSignal: z.enum(["SIGINT", "SIGTERM"]), graceMs: z.number() });
const record = z.object({ supervisor: identity, children: z.array(child) });

export type RecordedChild = z.infer<typeof child>;
type PidRecord = z.infer<typeof record>;

class AlreadyRunning extends Error {
  override name = "AlreadyRunning";
}

function read(file: string): PidRecord | undefined {
  if (!existsSync(file)) return undefined;
  try {
    const parsed = record.safeParse(JSON.parse(readFileSync(file, "utf8")));
    return parsed.success ? parsed.data : undefined;
  } catch {
    return undefined;
  }
}

/** True when the run that wrote this file is still alive. */
export function isClaimed(file: string): boolean {
  const found = read(file);
  return found !== undefined && found.supervisor.pid !== process.pid && isStillRunning(found.supervisor);
}

/** Ends what a killed run left behind. Throws AlreadyRunning when that run is alive. */
export async function endLeftovers(file: string): Promise<string[]> {
  const found = read(file);
  if (!found) return [];
  if (isClaimed(file)) {
    throw new AlreadyRunning(
      `Another run (process ${found.supervisor.pid}) uses ${dirname(file)}. Stop that one first.`,
    );
  }
  const left = found.children.filter(isStillRunning);
  for (const one of left.reverse()) await endProcess(one, one.stopSignal, one.graceMs);
  rmSync(file, { force: true });
  return left.map((one) => `${one.name} (process ${one.pid})`);
}

/** Writes down who runs, in one step, so that a later run never reads half a file. */
export function writePidFile(file: string, children: RecordedChild[]): void {
  const supervisor = identify(process.pid);
  if (!supervisor) return;
  mkdirSync(dirname(file), { recursive: true });
  const content: PidRecord = { supervisor, children };
  writeFileSync(`${file}.new`, JSON.stringify(content, null, 2), { mode: 0o600 });
  renameSync(`${file}.new`, file);
}

export function removePidFile(file: string): void {
  rmSync(file, { force: true });
}
