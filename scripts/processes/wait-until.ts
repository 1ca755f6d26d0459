import { setTimeout as delay } from "node:timers/promises";
import type { Child } from "./start-child";

function failure(child: Child, what: string): Error {
  return new Error(
    [`${child.name} ${what}. Its last lines:`, ...child.lines.tail().map((line) => `  ${line}`)].join("\n"),
  );
}

/** Tries until it succeeds; gives up when the child ends or the time is over. */
export async function waitUntil(child: Child, isReady: () => Promise<boolean>, timeoutMs: number): Promise<void> {
  const deadline = Date.now() + timeoutMs;
  for (;;) {
    if (child.hasExited()) throw failure(child, "ended while starting");
    if (await isReady()) return;
    if (Date.now() > deadline) throw failure(child, `was not ready after ${Math.round(timeoutMs / 1000)} s`);
    await delay(80);
  }
}

async function answers(url: string, accept: (status: number) => boolean): Promise<boolean> {
  try {
    const response = await fetch(url, { signal: AbortSignal.timeout(5000), redirect: "manual" });
    await response.body?.cancel();
    return accept(response.status);
  } catch {
    return false;
  }
}

/** Waits until the address answers with a good status (or any, when asked so). */
export function waitForHttp(
  child: Child,
  url: string,
  timeoutMs = 30_000,
  accept = (status: number) => status < 400,
): Promise<void> {
  return waitUntil(child, () => answers(url, accept), timeoutMs);
}
