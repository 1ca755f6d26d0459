import { z } from "zod";
import { line, optionalLines } from "@/lib/form/text";
import { writeId } from "@/lib/form/write-id";
import { rangeSchema } from "./range-schema";

export const INSTRUMENT_KINDS = ["meter", "scope", "supply", "other"] as const;
export const MAX_RANGES = 40;

/** `instrument` is its id, or "" for a new one. */
export const saveInstrumentInput = z.object({
  writeId,
  instrument: z.union([z.uuid(), z.literal("")], { message: "Name the instrument." }),
  name: line(120, "Name the instrument as it stands on the bench."),
  kind: z.enum(INSTRUMENT_KINDS, { message: "Choose what it is." }),
  calibrationNote: optionalLines(2000),
  ranges: z.array(rangeSchema).max(MAX_RANGES, `At most ${MAX_RANGES} ranges.`),
});
export type SaveInstrumentInput = z.output<typeof saveInstrumentInput>;
export type SaveInstrumentTyped = z.input<typeof saveInstrumentInput>;

export const changeInstrumentInput = z.object({ writeId, instrument: z.uuid({ message: "Name the instrument." }) });
export type ChangeInstrumentInput = z.output<typeof changeInstrumentInput>;
