import { createHash } from "node:crypto";
import { chmodSync, lstatSync, mkdirSync } from "node:fs";
import { tmpdir } from "node:os";
import { join, resolve } from "node:path";
import { mayEnter, type User } from "./server-user";

/** A folder under the temporary one must be ours: anybody may have made one of that name before. */
function makeOwnFolder(folder: string): void {
  mkdirSync(folder, { recursive: true, mode: 0o711 });
  const found = lstatSync(folder);
  if (!found.isDirectory() || found.uid !== process.getuid?.()) throw new Error(`${folder} belongs to somebody else.`);
  chmodSync(folder, 0o711);
}

/**
 * Where PostgreSQL keeps its files: `<dataDir>/postgres`. As root the server runs as another user, who may be unable to
 * enter the project (for example below /root); then a folder under the temporary one stands in, keyed by the path.
 */
export function baseFolder(dataDir: string, user: User | undefined): string {
  const wanted = resolve(dataDir, "postgres");
  mkdirSync(wanted, { recursive: true });
  if (!user || mayEnter(user, wanted)) return wanted;

  const key = createHash("sha256").update(wanted).digest("hex").slice(0, 16);
  const standIn = join(tmpdir(), `boardwake-postgres-${key}`);
  makeOwnFolder(standIn);
  console.log(`The user postgres may not enter ${wanted}: the database is kept in ${standIn} instead.`);
  return standIn;
}
