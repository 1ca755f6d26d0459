import { randomUUID } from "node:crypto";
import { rename, writeFile } from "node:fs/promises";

/** Writes beside the target and renames, so that a killed fake leaves the old file or the new one. */
export async function writeAtomically(file: string, content: string | Uint8Array): Promise<void> {
  const fresh = `${file}.${randomUUID()}.new`;
  await writeFile(fresh, content, { mode: 0o600 });
  await rename(fresh, file);
}
