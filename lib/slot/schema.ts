import { z } from "zod";
import { optionalLine } from "@/lib/form/text";

const writeId = z.uuid({ message: "The write id is missing." });

const slotFields = {
  position: z
    .int({ message: "The position is a whole number, counted from 1." })
    .min(1, "Positions count from 1.")
    .max(99, "A backplane has at most 99 slots here."),
  label: optionalLine(40),
  /** 1 HP is 5.08 mm. */
  pitchHp: z
    .number({ message: "The pitch is a number of HP; 1 HP is 5.08 mm." })
    .min(1, "A slot is at least 1 HP (5.08 mm) wide.")
    .max(84, "A slot is at most 84 HP wide, the whole width of a 19-inch rack."),
  boardId: z.uuid().nullable(),
};

export const createSlotInput = z.object({ project: z.string(), writeId, ...slotFields });
export type CreateSlotInput = z.output<typeof createSlotInput>;

export const editSlotInput = z.object({
  project: z.string(),
  writeId,
  slotId: z.uuid(),
  version: z.int(),
  ...slotFields,
});
export type EditSlotInput = z.output<typeof editSlotInput>;

export const changeSlotInput = z.object({ project: z.string(), writeId, slotId: z.uuid() });
export type ChangeSlotInput = z.output<typeof changeSlotInput>;

export const placeUnitInput = z.object({
  project: z.string(),
  writeId,
  slotId: z.uuid(),
  unitId: z.uuid({ message: "Choose a unit." }),
});
export type PlaceUnitInput = z.output<typeof placeUnitInput>;
