import { setTimeout as delay } from "node:timers/promises";
import { isStillRunning, type Identity } from "./identity";

/** SIGINT is PostgreSQL's fast shutdown (SIGTERM would wait for every client). */
export type StopSignal = "SIGINT" | "SIGTERM";

/**
 * Signals a process that was started as the leader of its own group, and with it what it started itself.
 * A SIGINT goes to the leader alone: the postmaster tells its own children.
 */
export function signalGroup(pid: number, signal: NodeJS.Signals): void {
  if (pid < 2) return;
  try {
    process.kill(signal === "SIGINT" ? pid : -pid, signal);
  } catch {
    // It ended in the meantime.
  }
}

/** Asks a process of ours to end, and ends it by force after the grace time. Never touches a process that only got its id. */
export async function endProcess(known: Identity, stopSignal: StopSignal, graceMs: number): Promise<void> {
  if (!isStillRunning(known)) return;
  signalGroup(known.pid, stopSignal);
  const deadline = Date.now() + graceMs;
  while (Date.now() < deadline) {
    await delay(50);
    if (!isStillRunning(known)) return;
  }
  signalGroup(known.pid, "SIGKILL");
  while (isStillRunning(known) && Date.now() < deadline + 5000) await delay(50);
}
