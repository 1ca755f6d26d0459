import { z } from "zod";
import { lines } from "@/lib/form/text";
import { writeId } from "@/lib/form/write-id";

const key = z.string({ message: "Name the finding." }).min(1, "Name the finding.").max(1000, "This is no finding.");

export const acceptFindingInput = z.object({
  project: z.string(),
  writeId,
  key,
  /** What the finding rested upon when the maintainer looked at it: other facts are another decision. */
  facts: z.string(),
  reason: lines(2000, "Say why it may stay as it is."),
});
export type AcceptFindingInput = z.output<typeof acceptFindingInput>;

export const withdrawAcceptanceInput = z.object({
  project: z.string(),
  writeId,
  key,
  reason: lines(2000, "Say why it may not stay as it is."),
});
export type WithdrawAcceptanceInput = z.output<typeof withdrawAcceptanceInput>;
