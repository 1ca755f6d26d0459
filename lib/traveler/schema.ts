import { z } from "zod";
import { writeId } from "@/lib/form/write-id";

const serial = z.string({ message: "Name the unit." }).trim().min(1, "Name the unit.").max(120);

export const startTravelerInput = z.object({ project: z.string(), writeId, unit: serial });
export type StartTravelerInput = z.infer<typeof startTravelerInput>;

export const moveTravelerInput = z.object({
  project: z.string(),
  writeId,
  unit: serial,
  /** The versions whose differences the person saw; others are refused with the current ones. */
  from: z.number().int().positive(),
  to: z.number().int().positive(),
});
export type MoveTravelerInput = z.infer<typeof moveTravelerInput>;
