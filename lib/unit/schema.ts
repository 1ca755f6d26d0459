import { z } from "zod";
import { optionalLines } from "@/lib/form/text";

const writeId = z.uuid({ message: "The write id is missing." });

/** Stands in addresses and on labels, so only plain characters. */
export const serial = z
  .string({ message: "Give the unit a serial number." })
  .trim()
  .toUpperCase()
  .regex(
    /^[A-Z0-9](?:[A-Z0-9._-]{0,22}[A-Z0-9])?$/,
    "A serial number is up to 24 letters, digits, dots or dashes, such as TIM-01.",
  );

const unitFields = {
  serial,
  revisionId: z.uuid({ message: "Choose the revision it was made from." }),
  note: optionalLines(2000),
};

export const createUnitInput = z.object({ project: z.string(), writeId, boardId: z.uuid(), ...unitFields });
export type CreateUnitInput = z.output<typeof createUnitInput>;

export const editUnitInput = z.object({
  project: z.string(),
  writeId,
  unitId: z.uuid(),
  version: z.int(),
  ...unitFields,
});
export type EditUnitInput = z.output<typeof editUnitInput>;

export const changeUnitInput = z.object({
  project: z.string(),
  writeId,
  unitId: z.uuid({ message: "Choose a unit." }),
});
export type ChangeUnitInput = z.output<typeof changeUnitInput>;

export const purgeUnitInput = changeUnitInput.extend({
  /** The serial number of the unit, typed by hand. */
  confirmation: z.string({ message: "Type the serial number of the unit." }).trim(),
});
export type PurgeUnitInput = z.output<typeof purgeUnitInput>;
