import { z } from "zod";
import { figure } from "@/lib/form/figure-field";
import { writeId } from "@/lib/form/write-id";

/** At least so many spares of every part that is needed. */
export const LEAST_SPARES = 1;

export const saveSparesInput = z.object({
  project: z.string(),
  writeId,
  /** Version of the conditions of the plan; 0 while nobody has set them. */
  version: z.int(),
  percent: figure("%", "Say how many spare parts to order, or 0.", { least: 0, most: 200, example: "10 %" }),
});
export type SaveSparesInput = z.output<typeof saveSparesInput>;

export const partsListInput = z.object({
  project: z.string(),
  /** Code of one board; without it the whole machine. */
  board: z.string().max(20).optional(),
});
export type PartsListInput = z.output<typeof partsListInput>;
