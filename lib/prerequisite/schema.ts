import { z } from "zod";
import { checkId } from "@/lib/check/schema";
import { writeId } from "@/lib/form/write-id";

/** checkId waits for needsCheckId, which may be on another unit of the same project. */
export const prerequisiteInput = z.object({ project: z.string(), writeId, checkId, needsCheckId: checkId });
export type PrerequisiteInput = z.infer<typeof prerequisiteInput>;
