import { z } from "zod";
import { lines, optionalLines } from "@/lib/form/text";
import { writeId } from "@/lib/form/write-id";

/** What the bench sends. The verdict is not among it: the server judges. */
export const recordAttemptInput = z.object({
  project: z.string(),
  /** Client-made; the attempt's own id and the id of the write. */
  id: z.uuid({ message: "The attempt has no id of its own." }),
  checkId: z.uuid({ message: "This is not the id of a check." }),
  performedAt: z.iso
    .datetime({ offset: true, message: "Say when it was carried out, as an instant with its offset." })
    .transform((text) => new Date(text)),
  record: z.unknown(),
  note: optionalLines(2000).default(""),
  instrumentId: z.uuid({ message: "This is not the id of an instrument." }).nullable().default(null),
  attachmentIds: z
    .array(z.uuid({ message: "This is not the id of a file." }))
    .max(20, "At most 20 files go with one attempt.")
    .transform((ids) => [...new Set(ids)])
    .default([]),
  /** Who made it, when it waited on a device that several people use. */
  madeBy: z.uuid().optional(),
  /** Arrival of the newest attempt the client had seen, to be told of one that came in between. */
  seenArrival: z.number().int().nonnegative().optional(),
});
export type RecordAttemptInput = z.output<typeof recordAttemptInput>;

export const voidAttemptInput = z.object({
  project: z.string(),
  writeId,
  attemptId: z.uuid({ message: "This is not the id of an attempt." }),
  reason: lines(2000, "Say what went wrong with it."),
});
export type VoidAttemptInput = z.infer<typeof voidAttemptInput>;
