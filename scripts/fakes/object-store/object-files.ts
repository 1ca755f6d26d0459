import { createHash } from "node:crypto";
import { createReadStream, type ReadStream } from "node:fs";
import { mkdir, readdir, readFile, rename, rm, stat } from "node:fs/promises";
import { join } from "node:path";
import { writeAtomically } from "../write-atomically";
import { storedObjectSchema, type StoredObject } from "./stored-object";

/** Keys come from outside: on disk only their hash is a name. */
const nameOf = (key: string) => createHash("sha256").update(key).digest("hex");

/**
 * Files on disk: `objects/<hash>.bin` with `<hash>.json`, and `incoming/<hash>.part` while a file arrives.
 * A file is stored exactly when its JSON is there, and that is written last.
 */
export async function openObjectFiles(folder: string) {
  const objects = join(folder, "objects");
  const incoming = join(folder, "incoming");
  const known = new Map<string, StoredObject>();
  const bytes = (key: string) => join(objects, `${nameOf(key)}.bin`);
  const facts = (key: string) => join(objects, `${nameOf(key)}.json`);

  await mkdir(objects, { recursive: true });
  await rm(incoming, { recursive: true, force: true });
  await mkdir(incoming, { recursive: true });
  const names = await readdir(objects);
  for (const name of names.filter((one) => one.endsWith(".json"))) {
    const found = storedObjectSchema.parse(JSON.parse(await readFile(join(objects, name), "utf8")));
    known.set(found.key, found);
  }
  const expected = new Set([...known.keys()].flatMap((key) => [bytes(key), facts(key)]));
  for (const name of names) if (!expected.has(join(objects, name))) await rm(join(objects, name), { force: true });

  return {
    /** Where the bytes of a file go while they arrive. */
    partial: (key: string) => join(incoming, `${nameOf(key)}.part`),

    async partialSize(key: string): Promise<number> {
      return stat(join(incoming, `${nameOf(key)}.part`)).then(
        (found) => found.size,
        () => 0,
      );
    },

    discardPartial: (key: string) => rm(join(incoming, `${nameOf(key)}.part`), { force: true }),

    /** Makes a file that has arrived whole a stored one. */
    async commit(object: StoredObject): Promise<void> {
      await rename(join(incoming, `${nameOf(object.key)}.part`), bytes(object.key));
      await writeAtomically(facts(object.key), JSON.stringify(object));
      known.set(object.key, object);
    },

    async change(object: StoredObject): Promise<void> {
      await writeAtomically(facts(object.key), JSON.stringify(object));
      known.set(object.key, object);
    },

    async remove(key: string): Promise<boolean> {
      const was = known.delete(key);
      for (const file of [facts(key), bytes(key), join(incoming, `${nameOf(key)}.part`)])
        await rm(file, { force: true });
      return was;
    },

    find: (key: string) => known.get(key),
    findByCustomId: (customId: string) => [...known.values()].find((object) => object.customId === customId),
    /** Newest first. */
    list: () => [...known.values()].sort((one, other) => other.uploadedAt - one.uploadedAt),
    read: (key: string, start: number, end: number): ReadStream => createReadStream(bytes(key), { start, end }),
  };
}

export type ObjectFiles = Awaited<ReturnType<typeof openObjectFiles>>;
