import { mkdirSync } from "node:fs";
import { join } from "node:path";
import { endLeftovers, removePidFile, writePidFile } from "./pid-file";
import { startChild, type Child, type ChildOptions } from "./start-child";

export type Supervisor = {
  start(options: ChildOptions): Child;
  /** Stops everything, newest first. Safe to call twice. */
  stopAll(): Promise<void>;
  /** Called once when a child ends that nobody stopped. `again` starts the same once more, unless all is being stopped. */
  onUnexpectedExit(listener: ExitListener): void;
};

type ExitListener = (child: Child, reason: string, again: () => Child | undefined) => void;

type Options = { dataDir: string; quiet: boolean };

/** Starts named children, writes down who they are, and stops them all: at the end, on Ctrl-C, on failure, and after a killed run. */
export async function createSupervisor({ dataDir, quiet }: Options): Promise<Supervisor> {
  mkdirSync(join(dataDir, "log"), { recursive: true });
  const pidFile = join(dataDir, "processes.json");
  const ended = await endLeftovers(pidFile);
  if (ended.length > 0) console.log(`Ended what an earlier run left behind: ${ended.join(", ")}.`);

  const children: Child[] = [];
  const listeners: ExitListener[] = [];
  let stopping: Promise<void> | undefined;
  const writeDown = () =>
    writePidFile(
      pidFile,
      children.filter((child) => !child.hasExited()).map((child) => child.record()),
    );
  writeDown();

  const killAll = () => children.forEach((child) => child.kill());
  process.once("exit", killAll);

  function start(options: ChildOptions): Child {
    if (stopping) throw new Error("Everything is being stopped.");
    const logFile = join(dataDir, "log", `${options.name}.log`);
    const child = startChild({ quiet, logFile, ...options });
    children.push(child);
    writeDown();
    void child.exited.then(({ code, signal }) => {
      if (stopping) return;
      writeDown();
      const reason = `${child.name} ended by itself (${signal ?? `exit code ${code}`})`;
      listeners.forEach((listener) => listener(child, reason, () => (stopping ? undefined : start(options))));
    });
    return child;
  }

  return {
    start,
    stopAll() {
      stopping ??= (async () => {
        for (const child of [...children].reverse()) await child.stop();
        removePidFile(pidFile);
        process.removeListener("exit", killAll);
      })();
      return stopping;
    },
    onUnexpectedExit: (listener) => listeners.push(listener),
  };
}
