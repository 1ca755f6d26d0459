import type { Supervisor } from "../processes/supervisor";

const PAUSE_MS = 5_000;
const WINDOW_MS = 120_000;
const MOST_ENDS = 6;

/**
 * Starts again whatever ends by itself, after a pause in which the rest shows how it does without. What ends again and
 * again stops the demo.
 */
export function keepRunning(supervisor: Supervisor): void {
  const ends = new Map<string, number[]>();
  let isStopping = false;
  supervisor.onUnexpectedExit((child, reason, again) => {
    if (isStopping) return;
    const since = Date.now() - WINDOW_MS;
    const recent = [...(ends.get(child.name) ?? []).filter((at) => at > since), Date.now()];
    ends.set(child.name, recent);
    if (recent.length < MOST_ENDS) {
      console.error(`${reason}. It starts again in ${PAUSE_MS / 1000} seconds.`);
      setTimeout(again, PAUSE_MS).unref();
      return;
    }
    isStopping = true;
    console.error([`${reason} ${MOST_ENDS} times. Its last lines:`, ...child.lines.tail().slice(-20)].join("\n  "));
    void supervisor.stopAll().then(() => process.exit(1));
  });
}
