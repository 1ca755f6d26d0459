import { spawn } from "node:child_process";

type Options = {
  env?: Record<string, string | undefined>;
  cwd?: string;
  user?: { uid: number; gid: number };
  /** "inherit" shows the output; otherwise it is collected. */
  show?: boolean;
  signal?: AbortSignal;
};

export type Ran = { code: number; output: string };

/** Runs a command to its end. Never throws for a failing command: look at the code. */
export function runToEnd(command: string, args: string[], options: Options = {}): Promise<Ran> {
  return new Promise((resolve) => {
    const child = spawn(command, args, {
      cwd: options.cwd,
      env: { ...process.env, ...options.env },
      stdio: options.show ? ["ignore", "inherit", "inherit"] : ["ignore", "pipe", "pipe"],
      signal: options.signal,
      ...options.user,
    });
    const parts: Buffer[] = [];
    child.stdout?.on("data", (chunk: Buffer) => parts.push(chunk));
    child.stderr?.on("data", (chunk: Buffer) => parts.push(chunk));
    const output = () => Buffer.concat(parts).toString("utf8");
    child.once("error", (error) => resolve({ code: 127, output: `${output()}${error.message}\n` }));
    child.once("close", (code) => resolve({ code: code ?? 1, output: output() }));
  });
}
