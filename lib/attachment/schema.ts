import { z } from "zod";
import type { AttachmentKind, ReworkSide } from "@/db/schema/evidence";
import { optionalLine } from "@/lib/form/text";
import { writeId } from "@/lib/form/write-id";
import { FILE_LIMITS } from "@/lib/storage/limits";
import type { EvidenceView } from "@/lib/traveler/traveler-view";

export const ATTACHMENT_KINDS = ["photo", "scope-picture", "scope-data"] as const satisfies readonly AttachmentKind[];

/** What the file is evidence of: a check, a log entry, a fault, one side of a rework, or nothing yet. */
export type EvidenceTarget = {
  checkId?: string;
  logEntryId?: string;
  faultId?: string;
  reworkId?: string;
  reworkSide?: ReworkSide;
};

/** What a client sends along with a file. */
export const uploadInput = z.object({
  project: z.string().max(100),
  /** The client's own UUID of this upload; the same for a retry. */
  uploadId: z.uuid(),
  /** What is wanted here. A picture becomes the first kind of picture among them. */
  kinds: z.array(z.enum(ATTACHMENT_KINDS)).min(1).max(3),
  checkId: z.uuid().optional(),
  logEntryId: z.uuid().optional(),
  faultId: z.uuid().optional(),
  reworkId: z.uuid().optional(),
  reworkSide: z.enum(["before", "after"]).optional(),
});
export type UploadInput = z.infer<typeof uploadInput>;

/** What the server answers once the whole file is there and was looked at. */
export type UploadAnswer = { ok: true; attachment: EvidenceView } | { ok: false; message: string; retry: boolean };

export const openFileInput = z.object({
  project: z.string(),
  file: z.uuid({ message: "This is not the address of a file." }),
  size: z.enum(["small", "large"], { message: "The size is small or large." }).optional(),
});
export type OpenFileInput = z.infer<typeof openFileInput>;

const write = { project: z.string(), writeId, attachmentId: z.uuid({ message: "Name the file." }) };

export const captionInput = z.object({ ...write, caption: optionalLine(FILE_LIMITS.captionCharacters) });
export type CaptionInput = z.infer<typeof captionInput>;

/** Remove and restore name the file only. */
export const attachmentInput = z.object(write);
export type AttachmentInput = z.infer<typeof attachmentInput>;
