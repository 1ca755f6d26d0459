import { randomBytes } from "node:crypto";
import { mkdir, readdir, readFile, rm } from "node:fs/promises";
import { join } from "node:path";
import { z } from "zod";
import { writeAtomically } from "../write-atomically";

/** What the list shows of one message, kept beside its source. */
const summarySchema = z.object({
  id: z.string(),
  from: z.string(),
  /** The envelope: who really got it, blind copies included. */
  to: z.array(z.string()),
  subject: z.string(),
  messageId: z.string().nullable(),
  receivedAt: z.string(),
  size: z.number(),
  attachments: z.array(z.object({ filename: z.string(), contentType: z.string(), size: z.number() })),
});

export type Summary = z.infer<typeof summarySchema>;

/** Each message as `<id>.eml` with `<id>.json`; the JSON is written last and makes it a message. */
export async function openMessageFiles(folder: string) {
  await mkdir(folder, { recursive: true });
  const all = new Map<string, Summary>();
  const names = await readdir(folder);
  for (const name of names.filter((one) => one.endsWith(".json"))) {
    const found = summarySchema.parse(JSON.parse(await readFile(join(folder, name), "utf8")));
    all.set(found.id, found);
  }
  let last = 0;

  return {
    /** Ids sort by time, also within one millisecond. */
    nextId(): string {
      last = Math.max(last + 1, Date.now());
      return `${last.toString(36)}-${randomBytes(4).toString("hex")}`;
    },
    async add(summary: Summary, source: Buffer): Promise<void> {
      await writeAtomically(join(folder, `${summary.id}.eml`), source);
      await writeAtomically(join(folder, `${summary.id}.json`), JSON.stringify(summary));
      all.set(summary.id, summary);
    },
    find: (id: string) => all.get(id),
    source: (id: string) => readFile(join(folder, `${id}.eml`)),
    /** Newest first. */
    list: () => [...all.values()].sort((one, other) => (one.id < other.id ? 1 : -1)),
    async clear(): Promise<void> {
      for (const id of all.keys()) {
        await rm(join(folder, `${id}.json`), { force: true });
        await rm(join(folder, `${id}.eml`), { force: true });
      }
      all.clear();
    },
  };
}

export type MessageFiles = Awaited<ReturnType<typeof openMessageFiles>>;
