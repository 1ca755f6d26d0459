import { z } from "zod";

const uuid = z.uuid();

/** Every background job and what it is handed. Payloads carry ids only, never a secret. */
export const jobPayloads = {
  /** Makes the two thumbnails of an image. */
  "make-thumbnails": z.object({ attachmentId: uuid }),
  /** Sends one account or notice mail; lib/mail/mails.ts renders it by kind from the row's id. */
  "send-mail": z.object({
    kind: z.enum(["confirm-address", "reset-password", "invitation", "check-reopened"]),
    id: uuid,
  }),
  /** Finds digests that are due and enqueues one job a project. */
  "find-due-digests": z.object({}),
  /** Sends the due digests of one project. */
  "send-project-digests": z.object({ projectId: uuid }),
  /** Removes objects without a row, expired tokens and old write ids. */
  sweep: z.object({}),
} as const satisfies Record<string, z.ZodType>;

export type JobName = keyof typeof jobPayloads;
export type JobPayload<Name extends JobName> = z.infer<(typeof jobPayloads)[Name]>;
