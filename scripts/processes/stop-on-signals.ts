import type { Supervisor } from "./supervisor";

/** Ctrl-C, a polite end and a closed terminal stop everything in order; a later second Ctrl-C does not wait. */
export function stopOnSignals(supervisor: Supervisor, message: string): void {
  let askedAt: number | undefined;
  const stop = async (signal: NodeJS.Signals) => {
    if (askedAt !== undefined) {
      // npm and shells pass the same Ctrl-C on, so one press may arrive twice.
      if (signal === "SIGINT" && Date.now() - askedAt > 1000) process.exit(130);
      return;
    }
    askedAt = Date.now();
    console.log(`\n${message}`);
    await supervisor.stopAll();
    process.exit(signal === "SIGINT" ? 0 : 143);
  };
  for (const signal of ["SIGINT", "SIGTERM", "SIGHUP"] as const) process.on(signal, () => void stop(signal));
}
