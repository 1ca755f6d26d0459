import { z } from "zod";
import { lines } from "@/lib/form/text";
import { writeId } from "@/lib/form/write-id";

export const checkId = z.uuid({ message: "This is not the id of a check." });
const onCheck = { project: z.string(), writeId, checkId };

export const reopenCheckInput = z.object({ ...onCheck, reason: lines(2000, "Say why it is to be repeated, and how.") });
export type ReopenCheckInput = z.infer<typeof reopenCheckInput>;

export const liftHoldInput = z.object({
  ...onCheck,
  reason: lines(2000, "Say why this unit may go on. It stays on the traveler for ever."),
});
export type LiftHoldInput = z.infer<typeof liftHoldInput>;
