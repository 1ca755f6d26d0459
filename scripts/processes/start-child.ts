import { spawn } from "node:child_process";
import { signalGroup, type StopSignal } from "./end-process";
import { identify } from "./identity";
import type { RecordedChild } from "./pid-file";
import { prefixLines, type Lines } from "./prefix-lines";

export type ChildOptions = {
  name: string;
  command: string;
  args: string[];
  env?: Record<string, string | undefined>;
  cwd?: string;
  /** Another user to run as; only root may. */
  user?: { uid: number; gid: number };
  quiet?: boolean;
  logFile?: string;
  stopSignal?: StopSignal;
  graceMs?: number;
};

type Exit = { code: number | null; signal: NodeJS.Signals | null };

export type Child = {
  name: string;
  pid: number;
  lines: Lines;
  exited: Promise<Exit>;
  hasExited(): boolean;
  record(): RecordedChild;
  stop(): Promise<void>;
  kill(): void;
};

/**
 * Starts a process in a group of its own: Ctrl-C reaches only the supervisor, which then stops its children in order,
 * and what a child itself started (Next.js has helpers) goes with it.
 */
export function startChild(options: ChildOptions): Child {
  const { name, command, args, stopSignal = "SIGTERM", graceMs = 8000 } = options;
  const spawned = spawn(command, args, {
    cwd: options.cwd,
    env: { ...process.env, ...options.env },
    stdio: ["ignore", "pipe", "pipe"],
    detached: true,
    ...options.user,
  });
  const lines = prefixLines({ name, quiet: options.quiet ?? false, logFile: options.logFile });
  lines.follow(spawned.stdout);
  lines.follow(spawned.stderr);

  let gone = false;
  const exited = new Promise<Exit>((resolve) => {
    const end = (exit: Exit) => {
      gone = true;
      lines.close();
      resolve(exit);
    };
    spawned.once("error", (error) => {
      process.stderr.write(`${name} could not be started: ${error.message}\n`);
      end({ code: 127, signal: null });
    });
    spawned.once("close", (code, signal) => end({ code, signal }));
  });
  const pid = spawned.pid ?? -1;

  const signal = (name: NodeJS.Signals) => {
    if (!gone) signalGroup(pid, name);
  };

  return {
    name,
    pid,
    lines,
    exited,
    hasExited: () => gone,
    record: () => ({ ...(identify(pid) ?? { pid, started: "", command: "" }), name, stopSignal, graceMs }),
    kill: () => signal("SIGKILL"),
    async stop() {
      signal(stopSignal);
      const timer = setTimeout(() => signal("SIGKILL"), graceMs);
      await exited;
      clearTimeout(timer);
    },
  };
}
