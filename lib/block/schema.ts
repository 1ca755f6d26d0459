import { z } from "zod";
import { countedRows, namedOnce } from "@/lib/form/whole-count";
import { line, optionalLines } from "@/lib/form/text";
import { writeId } from "@/lib/form/write-id";

/** More rows than this make a block that nobody can read. */
export const MOST_ROWS = 60;

const gateRow = z.object({ gateFunction: z.string().max(60), count: z.string() });
const childRow = z.object({ block: z.string(), count: z.string() });

/** `block` is its id, or "" for a new one. */
export const saveBlockInput = z.object({
  project: z.string(),
  writeId,
  block: z.union([z.uuid(), z.literal("")], { message: "Name the block." }),
  version: z.int(),
  name: line(80, "Give the block a name."),
  summary: optionalLines(2000),
  gates: countedRows(gateRow, MOST_ROWS, namedOnce("gateFunction", "what the gates do")),
  children: countedRows(childRow, MOST_ROWS, namedOnce("block", "a block")),
});
export type SaveBlockInput = z.output<typeof saveBlockInput>;

export const changeBlockInput = z.object({
  project: z.string(),
  writeId,
  block: z.uuid({ message: "Name the block." }),
});
export type ChangeBlockInput = z.output<typeof changeBlockInput>;
