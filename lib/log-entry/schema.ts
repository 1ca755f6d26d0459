import { z } from "zod";
import { line, optionalLine, optionalLines } from "@/lib/form/text";
import { writeId } from "@/lib/form/write-id";
import { FILE_LIMITS } from "@/lib/storage/limits";

export const ENTRY_LIMITS = { title: 200, body: 50_000, pictures: 60 } as const;

const entryFields = {
  title: line(ENTRY_LIMITS.title, "Give the entry a title."),
  /** Markdown. HTML in it is shown as text. */
  body: optionalLines(ENTRY_LIMITS.body),
  /** Serial of the unit it is about; empty when it is about the machine as a whole. */
  unit: optionalLine(60),
  /** In the order in which they stand under the text. */
  pictures: z
    .array(z.object({ id: z.uuid(), caption: optionalLine(FILE_LIMITS.captionCharacters) }))
    .max(ENTRY_LIMITS.pictures, `An entry takes at most ${ENTRY_LIMITS.pictures} pictures. Write a second one.`)
    .refine((list) => new Set(list.map((one) => one.id)).size === list.length, "A picture is listed twice."),
};

export const writeEntryInput = z.object({ project: z.string(), writeId, ...entryFields });
export type WriteEntryInput = z.output<typeof writeEntryInput>;

export const editEntryInput = writeEntryInput.extend({
  entryId: z.uuid({ message: "Name the entry." }),
  version: z.int(),
});
export type EditEntryInput = z.output<typeof editEntryInput>;

export const entryInput = z.object({ project: z.string(), writeId, entryId: z.uuid({ message: "Name the entry." }) });
export type EntryInput = z.output<typeof entryInput>;
