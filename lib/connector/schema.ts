import { z } from "zod";
import { gridProblems, isConnectorId } from "@/lib/calc/connector";
import { line } from "@/lib/form/text";
import { writeId } from "@/lib/form/write-id";

const reference = line(20, "Name the connector as the board does, such as J1.").regex(
  /^[^\s,;"'.]+$/,
  "Write the reference in one word, such as J1 or X3.",
);

const grid = z
  .object({
    rows: z.array(z.string().trim().max(3, "Name a row with one to three letters, such as a.")).max(100),
    positions: z.number({ message: "Give the positions as a whole number." }),
    pitchMm: z.number({ message: "Give the pitch as a number of millimetres." }),
  })
  .superRefine((typed, context) => {
    for (const message of gridProblems(typed)) context.addIssue({ code: "custom", message });
  });

const fields = {
  reference,
  type: z
    .string({ message: "Choose the connector's face." })
    .refine((id): boolean => id === "grid" || isConnectorId(id), "Choose a face from the list, or one of your own."),
  /** With type "grid" only. */
  grid: grid.nullable(),
  /** On the backplane: the slot that it makes. */
  slotId: z.uuid({ message: "Choose a slot from the list." }).nullable(),
  /** On the backplane: the card's connector that plugs in here. */
  takes: reference,
  cabledTo: z.uuid({ message: "Choose a connector from the list." }).nullable(),
};

const complete = (typed: { type: string; grid: unknown }) => typed.type !== "grid" || typed.grid !== null;
const MISSING_GRID = { path: ["grid"], message: "Say the rows, positions and pitch of your own face." };

export const addConnectorInput = z
  .object({ project: z.string(), writeId, boardId: z.uuid({ message: "Choose a board." }), ...fields })
  .refine(complete, MISSING_GRID);
export type AddConnectorInput = z.output<typeof addConnectorInput>;

export const editConnectorInput = z
  .object({
    project: z.string(),
    writeId,
    connectorId: z.uuid(),
    version: z.int({ message: "The version is missing." }),
    /** Its place in the board's own order, from 1; the first is the edge connector that the rack draws. */
    position: z.int({ message: "The place is a whole number." }).min(1, "Places count from 1."),
    ...fields,
  })
  .refine(complete, MISSING_GRID);
export type EditConnectorInput = z.output<typeof editConnectorInput>;

export const removeConnectorInput = z.object({
  project: z.string(),
  writeId,
  connectorId: z.uuid(),
  version: z.int({ message: "The version is missing." }),
});
export type RemoveConnectorInput = z.output<typeof removeConnectorInput>;
