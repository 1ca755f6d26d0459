import { existsSync } from "node:fs";
import { join } from "node:path";
import type { Child } from "./processes/start-child";
import type { Supervisor } from "./processes/supervisor";
import { waitForHttp } from "./processes/wait-until";
import { nextCommand, root, typescript } from "./run-typescript";

type Options = { supervisor: Supervisor; env: Record<string, string>; port: number; name?: string };

/** Starts the built app and waits until it says that it is well. */
export async function startApp({ supervisor, env, port, name = "app" }: Options): Promise<Child> {
  const args = [nextCommand, "start", "-p", String(port), "-H", "127.0.0.1"];
  const app = supervisor.start({
    name,
    command: process.execPath,
    args,
    cwd: root,
    env: { ...env, NODE_ENV: "production" },
  });
  await waitForHttp(app, `http://127.0.0.1:${port}/api/health`, 60_000);
  return app;
}

export function startWorker(
  { supervisor, env }: Omit<Options, "port">,
  nodeEnv: "production" | "development" = "production",
): void {
  if (!existsSync(join(root, "scripts/worker.ts"))) return;
  supervisor.start({
    name: "worker",
    command: process.execPath,
    args: typescript("scripts/worker.ts"),
    cwd: root,
    env: { ...env, NODE_ENV: nodeEnv },
  });
}
