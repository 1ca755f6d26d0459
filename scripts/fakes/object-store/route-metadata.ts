import { mkdir, readFile, rm } from "node:fs/promises";
import { createHash } from "node:crypto";
import { join } from "node:path";
import { setTimeout as delay } from "node:timers/promises";
import { z } from "zod";
import { writeAtomically } from "../write-atomically";

export const routeMetadataSchema = z.object({
  fileKeys: z.array(z.string()).min(1).max(100),
  metadata: z.record(z.string(), z.unknown()).nullish(),
  isDev: z.boolean().default(false),
  callbackUrl: z.url({ protocol: /^https?$/ }),
  callbackSlug: z.string(),
  awaitServerData: z.boolean().default(true),
});

const callbackSchema = routeMetadataSchema.omit({ fileKeys: true });
/** Whom to tell about a file, and what the app wants to hear again. */
export type Callback = z.infer<typeof callbackSchema>;

/** What the app registered for announced files, on disk so that a restart keeps it. */
export async function openRouteMetadata(folder: string) {
  const kept = join(folder, "announced");
  await mkdir(kept, { recursive: true });
  const fileOf = (key: string) => join(kept, `${createHash("sha256").update(key).digest("hex")}.json`);

  const find = async (key: string): Promise<Callback | undefined> => {
    const text = await readFile(fileOf(key), "utf8").catch(() => undefined);
    return text === undefined ? undefined : callbackSchema.parse(JSON.parse(text));
  };

  return {
    async register({ fileKeys, ...callback }: z.infer<typeof routeMetadataSchema>): Promise<void> {
      for (const key of fileKeys) await writeAtomically(fileOf(key), JSON.stringify(callback));
    },
    /** The upload may be faster than the registration. */
    async wait(key: string, timeoutMs: number): Promise<Callback | undefined> {
      const deadline = Date.now() + timeoutMs;
      for (;;) {
        const found = await find(key);
        if (found || Date.now() > deadline) return found;
        await delay(50);
      }
    },
    find,
    forget: (key: string) => rm(fileOf(key), { force: true }),
  };
}
