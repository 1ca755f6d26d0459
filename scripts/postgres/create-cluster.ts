import { randomBytes } from "node:crypto";
import { chownSync, existsSync, mkdirSync, readFileSync, renameSync, rmSync, statSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { runToEnd } from "../processes/run-to-end";
import type { Binaries } from "./find-binaries";
import type { User } from "./server-user";

export type Cluster = { folder: string; password: string; binaries: Binaries };

export const superuser = "boardwake";

function matching(all: Binaries[], folder: string): Binaries {
  const major = Number(readFileSync(join(folder, "PG_VERSION"), "utf8"));
  const found = all.find((one) => one.major === major);
  if (!found)
    throw new Error(
      `${folder} was made by PostgreSQL ${major}, which is not installed. Install it, or remove the folder.`,
    );
  return found;
}

async function initialise(binaries: Binaries, base: string, user: User | undefined, password: string): Promise<string> {
  const fresh = join(base, "cluster.new");
  const passwordFile = join(base, "initial-password");
  rmSync(fresh, { recursive: true, force: true });
  mkdirSync(fresh, { mode: 0o700 });
  writeFileSync(passwordFile, `${password}\n`, { mode: 0o600 });
  if (user) for (const path of [fresh, passwordFile]) chownSync(path, user.uid, user.gid);
  const args = [`--pgdata=${fresh}`, `--username=${superuser}`, `--pwfile=${passwordFile}`, "--encoding=UTF8"];
  const options = ["--auth=scram-sha-256", "--locale=C.UTF-8", "--no-instructions"];
  const ran = await runToEnd(join(binaries.folder, "initdb"), [...args, ...options], { cwd: "/", user });
  rmSync(passwordFile, { force: true });
  if (ran.code !== 0) throw new Error(`initdb failed:\n${ran.output}`);
  return fresh;
}

function checkOwner(folder: string, user: User | undefined): void {
  const owner = statSync(folder).uid;
  const expected = user?.uid ?? process.getuid?.();
  if (expected !== undefined && owner !== expected) {
    throw new Error(
      `${folder} was made by another user (id ${owner}). Start as that user again, or remove the folder.`,
    );
  }
}

/** The cluster in the base folder, made on first use. A run killed while making it leaves nothing that looks like one. */
export async function clusterIn(base: string, all: Binaries[], user: User | undefined): Promise<Cluster> {
  const folder = join(base, "cluster");
  const passwordFile = join(base, "password");
  if (existsSync(join(folder, "PG_VERSION"))) {
    checkOwner(folder, user);
    return { folder, password: readFileSync(passwordFile, "utf8").trim(), binaries: matching(all, folder) };
  }
  const [newest] = all;
  if (!newest) throw new Error("PostgreSQL is not installed.");
  const password = randomBytes(24).toString("base64url");
  const fresh = await initialise(newest, base, user, password);
  writeFileSync(passwordFile, `${password}\n`, { mode: 0o600 });
  rmSync(folder, { recursive: true, force: true });
  renameSync(fresh, folder);
  return { folder, password, binaries: newest };
}
