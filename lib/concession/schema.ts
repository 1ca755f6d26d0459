import { z } from "zod";
import { lines } from "@/lib/form/text";
import { checkId } from "@/lib/check/schema";
import { writeId } from "@/lib/form/write-id";

const reason = (missing: string) => lines(2000, missing);

export const grantConcessionInput = z.object({
  project: z.string(),
  writeId,
  checkId,
  /** The attempt the maintainer saw; a newer one is refused, since it is not what was accepted. */
  attemptId: z.uuid({ message: "This is not the id of an attempt." }).optional(),
  reason: reason("Say why it is accepted though it does not conform."),
});
export type GrantConcessionInput = z.infer<typeof grantConcessionInput>;

export const withdrawConcessionInput = z.object({
  project: z.string(),
  writeId,
  concessionId: z.uuid({ message: "This is not the id of a concession." }),
  reason: reason("Say why it is no longer accepted."),
});
export type WithdrawConcessionInput = z.infer<typeof withdrawConcessionInput>;
