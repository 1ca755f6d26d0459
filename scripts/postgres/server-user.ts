import { execFileSync, spawnSync } from "node:child_process";

export type User = { uid: number; gid: number };

/** PostgreSQL refuses to run as root: as root it gets the package's own user, otherwise it runs as we do. */
export function serverUser(): User | undefined {
  if (process.getuid?.() !== 0) return undefined;
  try {
    const id = (flag: string) =>
      Number(execFileSync("id", [flag, "postgres"], { encoding: "utf8", stdio: ["ignore", "pipe", "ignore"] }));
    return { uid: id("-u"), gid: id("-g") };
  } catch {
    throw new Error(
      "PostgreSQL must not run as root and there is no user named postgres. Run this as an ordinary user instead.",
    );
  }
}

/** Whether that user may enter the folder: every folder above it has to let it pass. */
export function mayEnter(user: User, folder: string): boolean {
  return spawnSync("/bin/sh", ["-c", 'cd "$1"', "sh", folder], { cwd: "/", stdio: "ignore", ...user }).status === 0;
}
