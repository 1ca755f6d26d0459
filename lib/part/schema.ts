import { z } from "zod";
import { line, optionalLine, optionalLines } from "@/lib/form/text";
import { wholeCount } from "@/lib/form/whole-count";
import { writeId } from "@/lib/form/write-id";
import { typedLogic } from "./typed-logic";
import { price } from "./price";

export const partNumber = line(80, "Give the part its number, as on the parts list.");
const stock = wholeCount("In stock", { least: 0, most: 1_000_000 });

/** `part` is its id, or "" for a new one. */
export const savePartInput = z.object({
  project: z.string(),
  writeId,
  part: z.union([z.uuid(), z.literal("")], { message: "Name the part." }),
  version: z.int(),
  number: partNumber,
  description: optionalLine(200),
  stock,
  price,
  note: optionalLines(2000),
  /** Null: no logic part, or one whose built-in data will do. */
  logic: typedLogic.nullable(),
});
export type SavePartInput = z.output<typeof savePartInput>;
export type SavePartTyped = z.input<typeof savePartInput>;

/** Stock and price of a part by its number, written where it is read; version 0 when nothing was known of it. */
export const stockPartInput = z.object({
  project: z.string(),
  writeId,
  number: partNumber,
  version: z.int(),
  stock,
  price,
});
export type StockPartInput = z.output<typeof stockPartInput>;

export const changePartInput = z.object({ project: z.string(), writeId, part: z.uuid({ message: "Name the part." }) });
export type ChangePartInput = z.output<typeof changePartInput>;
