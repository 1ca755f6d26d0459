import { z } from "zod";
import { line } from "@/lib/form/text";
import { writeId } from "@/lib/form/write-id";
import { powerLineItem } from "./line-item";
import { typedLineForm } from "./typed-line";

const ofBoard = {
  project: z.string(),
  writeId,
  /** Code of the board. */
  board: line(20, "Name the board."),
};

export const savePowerLineInput = z.object({
  ...ofBoard,
  /** Id of the line, or "" for a new one. */
  line: z.union([z.uuid(), z.literal("")], { message: "Name the line." }),
  /** The line as it was looked at: another one there now is a conflict. */
  seen: powerLineItem.nullable(),
  typed: typedLineForm,
});
export type SavePowerLineInput = z.output<typeof savePowerLineInput>;
export type SavePowerLineTyped = z.input<typeof savePowerLineInput>;

export const removePowerLineInput = z.object({
  ...ofBoard,
  line: z.uuid({ message: "Name the line." }),
  seen: powerLineItem,
});
export type RemovePowerLineInput = z.output<typeof removePowerLineInput>;
