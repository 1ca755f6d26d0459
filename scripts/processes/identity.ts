import { execFileSync } from "node:child_process";
import { readFileSync } from "node:fs";

/**
 * What makes a process itself. Ids are reused, so the moment it started is compared as well.
 * The command line is kept for people who read the file: programs such as Next.js rewrite their own.
 */
export type Identity = { pid: number; started: string; command: string };

function fromProc(pid: number): Identity | undefined {
  const stat = readFileSync(`/proc/${pid}/stat`, "utf8");
  // The name in parentheses may hold spaces; the fields after it are plain. State is field 3, start time field 22.
  const fields = stat.slice(stat.lastIndexOf(")") + 2).split(" ");
  if (fields[0] === "Z") return undefined;
  const boot = readFileSync("/proc/sys/kernel/random/boot_id", "utf8").trim();
  const command = readFileSync(`/proc/${pid}/cmdline`, "utf8").replaceAll("\0", " ").trim();
  return { pid, started: `${boot} ${fields[19]}`, command };
}

function fromPs(pid: number): Identity | undefined {
  const line = execFileSync("ps", ["-o", "lstart=,command=", "-p", String(pid)], { encoding: "utf8" }).trim();
  return line === "" ? undefined : { pid, started: line.slice(0, 24), command: line.slice(24).trim() };
}

/** The identity of a running process, or undefined when there is none (a zombie counts as none). */
export function identify(pid: number): Identity | undefined {
  try {
    return process.platform === "linux" ? fromProc(pid) : fromPs(pid);
  } catch {
    return undefined;
  }
}

export function isStillRunning(known: Identity): boolean {
  const now = identify(known.pid);
  return now !== undefined && now.started === known.started;
}
