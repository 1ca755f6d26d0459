import { z } from "zod";
import { CONNECTOR_IDS } from "@/lib/calc/connector";
import { line, optionalLines } from "@/lib/form/text";

const writeId = z.uuid({ message: "The write id is missing." });
const version = z.int({ message: "The version is missing." });

/** Begins the serial numbers of the units, so it is short and plain: TIM, CON, BP. */
export const boardCode = z
  .string({ message: "Give the board a code." })
  .trim()
  .toUpperCase()
  .regex(/^[A-Z][A-Z0-9]{1,7}$/, "A code is 2 to 8 letters or digits and begins with a letter, such as TIM.");

const boardFields = {
  name: line(120, "Give the board a name."),
  summary: optionalLines(2000),
  kind: z.enum(["card", "backplane"], { message: "Choose card or backplane." }),
  connectorType: z.enum([...CONNECTOR_IDS, "grid"], { message: "Choose a connector from the list." }).nullable(),
  connectorReference: line(20, "Name the connector as the board does, such as J1."),
};

export const createBoardInput = z.object({ project: z.string(), writeId, code: boardCode, ...boardFields });
export type CreateBoardInput = z.output<typeof createBoardInput>;

export const editBoardInput = z.object({
  project: z.string(),
  writeId,
  boardId: z.uuid(),
  version,
  code: boardCode,
  ...boardFields,
});
export type EditBoardInput = z.output<typeof editBoardInput>;

export const changeBoardInput = z.object({ project: z.string(), writeId, boardId: z.uuid() });
export type ChangeBoardInput = z.output<typeof changeBoardInput>;

export const purgeBoardInput = changeBoardInput.extend({
  /** The code of the board, typed by hand. */
  confirmation: z.string({ message: "Type the code of the board." }).trim(),
});
export type PurgeBoardInput = z.output<typeof purgeBoardInput>;

export const createRevisionInput = z.object({
  project: z.string(),
  writeId,
  boardId: z.uuid(),
  notes: optionalLines(2000),
});
export type CreateRevisionInput = z.output<typeof createRevisionInput>;

export const releaseRevisionInput = z.object({ project: z.string(), writeId, revisionId: z.uuid() });
export type ReleaseRevisionInput = z.output<typeof releaseRevisionInput>;
