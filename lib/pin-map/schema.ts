import { z } from "zod";
import { writeId } from "@/lib/form/write-id";

/** More pins than any face has: the largest grid is 26 rows of 200. */
const MOST_ROWS = 6000;

/** Text as it was typed, or a figure from a program; what it means is read in the use case, which names pin and column. */
const cell = z
  .union([z.string().max(500, "There is more text in a cell than fits."), z.number()], {
    message: "A cell holds text or a number.",
  })
  .nullish()
  .transform((typed) => (typed === null || typed === undefined ? "" : String(typed)));

const pinRow = z.object({
  pin: z.string({ message: "A row has no pin." }).trim().min(1, "A row has no pin.").max(20, "This is no pin."),
  signal: cell,
  role: cell,
  family: cell,
  loads: cell,
  enableGroup: cell,
  pullUpOhm: cell,
  note: cell,
});

export const savePinMapInput = z.object({
  project: z.string(),
  writeId,
  connectorId: z.uuid({ message: "Name the connector." }),
  /** The version that the edit was made against. */
  version: z.int({ message: "The version is missing." }),
  /** Changed rows only; a row without a word in it takes what the pin carried away. */
  pins: z
    .array(pinRow)
    .min(1, "There is nothing to save.")
    .max(MOST_ROWS, `At most ${MOST_ROWS} rows are saved at once.`),
});
export type SavePinMapInput = z.output<typeof savePinMapInput>;

/** Several connectors at once, from a file: all of them or none. */
export const takePinMapsInput = z.object({
  project: z.string(),
  writeId,
  connectors: z
    .array(savePinMapInput.pick({ connectorId: true, version: true, pins: true }))
    .min(1, "There is nothing to take.")
    .max(500, "At most 500 connectors are taken at once."),
});
export type TakePinMapsInput = z.output<typeof takePinMapsInput>;

export const copyPinMapInput = z.object({
  project: z.string(),
  writeId,
  connectorId: z.uuid({ message: "Name the connector." }),
  version: z.int({ message: "The version is missing." }),
  /** Slots to copy to, each with the version of its connector that was looked at; null where it has none yet. */
  slots: z
    .array(z.object({ slotId: z.uuid(), version: z.int().nullable() }))
    .min(1, "Choose at least one slot.")
    .max(99, "A backplane has at most 99 slots here."),
});
export type CopyPinMapInput = z.output<typeof copyPinMapInput>;
