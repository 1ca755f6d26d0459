import { mkdir, readdir, readFile, rm } from "node:fs/promises";
import { join } from "node:path";
import { z } from "zod";
import { writeAtomically } from "../write-atomically";
import { mailSchema } from "./mail-schema";

const messageSchema = z.object({
  id: z.string(),
  mail: mailSchema,
  state: z.enum(["waiting", "delivered", "bounced"]),
  note: z.string().optional(),
});

const acceptedSchema = z.object({
  id: z.string(),
  acceptedAt: z.number(),
  key: z.string().optional(),
  payloadHash: z.string(),
  /** What was answered, and is answered again for the same key. */
  answer: z.unknown(),
  messages: z.array(messageSchema),
});

export type Message = z.infer<typeof messageSchema>;
export type Accepted = z.infer<typeof acceptedSchema>;

const keptMs = 24 * 60 * 60 * 1000;

/**
 * Every accepted request in one file: its idempotency key, its answer and its messages. Written before the answer goes
 * out, so that after a crash a repeated key is known and what was accepted is still delivered.
 */
export async function openAcceptedRequests(folder: string) {
  await mkdir(folder, { recursive: true });
  const all = new Map<string, Accepted>();
  const byKey = new Map<string, Accepted>();
  const fileOf = (id: string) => join(folder, `${id}.json`);
  const isFresh = (one: Accepted) => Date.now() - one.acceptedAt < keptMs;

  for (const name of await readdir(folder)) {
    if (!name.endsWith(".json")) {
      await rm(join(folder, name), { force: true });
      continue;
    }
    const found = acceptedSchema.parse(JSON.parse(await readFile(join(folder, name), "utf8")));
    all.set(found.id, found);
    if (found.key !== undefined && isFresh(found)) byKey.set(found.key, found);
  }

  return {
    async add(accepted: Accepted): Promise<void> {
      await writeAtomically(fileOf(accepted.id), JSON.stringify(accepted));
      all.set(accepted.id, accepted);
      if (accepted.key !== undefined) byKey.set(accepted.key, accepted);
    },
    save: (accepted: Accepted) => writeAtomically(fileOf(accepted.id), JSON.stringify(accepted)),
    /** The request that used this key in the last 24 hours. */
    findByKey(key: string): Accepted | undefined {
      const found = byKey.get(key);
      return found && isFresh(found) ? found : undefined;
    },
    findMessage(id: string): { accepted: Accepted; message: Message } | undefined {
      for (const accepted of all.values()) {
        const message = accepted.messages.find((one) => one.id === id);
        if (message) return { accepted, message };
      }
      return undefined;
    },
    waiting: () => [...all.values()].filter(({ messages }) => messages.some(({ state }) => state === "waiting")),
    list: () => [...all.values()].sort((one, other) => other.acceptedAt - one.acceptedAt),
    async clear(): Promise<void> {
      for (const id of all.keys()) await rm(fileOf(id), { force: true });
      all.clear();
      byKey.clear();
    },
  };
}

export type AcceptedRequests = Awaited<ReturnType<typeof openAcceptedRequests>>;
