import { z } from "zod";
import type { EntryView } from "@/lib/log-entry/entry-view";
import type { EvidenceView } from "@/lib/traveler/traveler-view";

/** What is being written: kept on this device with every change until it is saved. */
export type EntryDraft = {
  /** Kept for every try of saving, also over a reload: the server writes the entry once. */
  writeId: string;
  title: string;
  body: string;
  unit: string;
  pictures: EvidenceView[];
  /** Of the entry that is edited; 0 for a new one. */
  version: number;
  savedAt: string | null;
};

const pictureSchema: z.ZodType<EvidenceView> = z.object({
  id: z.uuid(),
  kind: z.enum(["photo", "scope-picture", "scope-data"]),
  fileName: z.string(),
  caption: z.string(),
  bytes: z.number(),
  width: z.number().nullable(),
  height: z.number().nullable(),
  hasThumbnails: z.boolean(),
  by: z.object({ id: z.string().nullable(), name: z.string() }),
  at: z.string(),
});

const draftSchema: z.ZodType<EntryDraft> = z.object({
  writeId: z.uuid(),
  title: z.string(),
  body: z.string(),
  unit: z.string(),
  pictures: z.array(pictureSchema),
  version: z.number(),
  savedAt: z.string().nullable(),
});

export const draftKey = (project: string, entryId: string | undefined) =>
  `boardwake.entry.${project}.${entryId ?? "new"}`;

export function freshDraft(entry: EntryView | undefined, unit: string): EntryDraft {
  const { title = "", body = "", pictures = [], version = 0 } = entry ?? {};
  return { writeId: crypto.randomUUID(), title, body, unit, pictures, version, savedAt: null };
}

/** Undefined when there is none, when it cannot be read, or when the device keeps nothing. */
export function readDraft(key: string): EntryDraft | undefined {
  try {
    const text = localStorage.getItem(key);
    return text === null ? undefined : draftSchema.safeParse(JSON.parse(text)).data;
  } catch {
    return undefined;
  }
}

/** False when the device does not keep it (private window, storage full): the editor then says so. */
export function keepDraft(key: string, draft: EntryDraft): boolean {
  try {
    localStorage.setItem(key, JSON.stringify({ ...draft, savedAt: new Date().toISOString() }));
    return true;
  } catch {
    return false;
  }
}

export function forgetDraft(key: string): void {
  try {
    localStorage.removeItem(key);
  } catch {
    // A device that keeps nothing has nothing to forget.
  }
}
