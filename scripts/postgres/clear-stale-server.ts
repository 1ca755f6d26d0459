import { existsSync, readdirSync, readFileSync, readlinkSync, rmSync } from "node:fs";
import { join } from "node:path";
import { setTimeout as delay } from "node:timers/promises";
import { endProcess } from "../processes/end-process";
import { identify } from "../processes/identity";

/** PostgreSQL's processes work inside their cluster's folder. */
function worksIn(pid: string, folder: string): boolean {
  try {
    return readlinkSync(`/proc/${pid}/cwd`) === folder;
  } catch {
    return false;
  }
}

function exists(pid: number): boolean {
  try {
    process.kill(pid, 0);
    return true;
  } catch {
    return false;
  }
}

async function untilNobodyWorksIn(folder: string): Promise<void> {
  for (let attempt = 0; attempt < 100; attempt += 1) {
    if (!existsSync("/proc") || !readdirSync("/proc").some((entry) => /^\d+$/.test(entry) && worksIn(entry, folder)))
      return;
    await delay(100);
  }
  throw new Error(`A killed PostgreSQL is still at work in ${folder}.`);
}

/**
 * After a killed run the cluster still holds postmaster.pid. The server it names is stopped when it is this cluster's.
 * When another program has that id by now, or only a zombie (nobody collects them in some containers), PostgreSQL would
 * refuse to start: the file goes once nobody works there any more. Otherwise it stays for PostgreSQL's own check.
 */
export async function clearStaleServer(cluster: string): Promise<void> {
  const file = join(cluster, "postmaster.pid");
  if (!existsSync(file)) return;
  const pid = Number(readFileSync(file, "utf8").split("\n")[0]);
  if (!Number.isInteger(pid) || pid < 2) return;
  const found = identify(pid);
  const isOurs = found?.command.includes("postgres") && found.command.includes(cluster);
  if (found && isOurs) await endProcess(found, "SIGINT", 15_000);
  if (!existsSync(file) || !exists(pid)) return;
  await untilNobodyWorksIn(cluster);
  rmSync(file, { force: true });
}
