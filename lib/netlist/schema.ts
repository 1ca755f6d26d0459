import { z } from "zod";
import type { IpcScale, PinListUnit } from "@/lib/calc/netlist";
import { writeId } from "@/lib/form/write-id";

/** What a netlist's file may be, stated where one is taken. */
export const NETLIST_LIMITS = { bytes: 20_000_000, points: 200_000, rows: 200_000 } as const;

/** Of the request that carries a file: JSON may write a character as several. */
export const NETLIST_BODY_LIMIT = 30_000_000;

export const IPC_SCALES = ["0.0001 inch", "0.00001 inch", "0.001 mm"] as const satisfies readonly IpcScale[];
export const PIN_LIST_UNITS = ["mm", "mil", "inch"] as const satisfies readonly PinListUnit[];

const file = {
  fileName: z.string().max(200, "The name of the file is longer than 200 characters."),
  text: z.string({ message: "The file's text is missing." }).max(NETLIST_LIMITS.bytes, "The file is too large."),
};
const column = z.number({ message: "A column is a number from 0." }).int().min(0).max(500);

const given = z.discriminatedUnion("source", [
  z.object({
    source: z.literal("ipc-d-356"),
    ...file,
    scale: z.enum(IPC_SCALES, { message: "This is no scale of such a file." }).nullable(),
  }),
  z.object({
    source: z.literal("pin-list"),
    ...file,
    delimiter: z.enum(["tab", "semicolon", "comma"], { message: "Say how the cells are separated." }),
    hasHeadings: z.boolean(),
    columns: z.object({
      net: column,
      part: column.nullable(),
      pin: column,
      x: column.nullable(),
      y: column.nullable(),
    }),
    unit: z.enum(PIN_LIST_UNITS, { message: "Say what the places are measured in." }),
  }),
  z.object({ source: z.literal("pin-map") }),
]);

/** A file with how it is to be read. */
export type NetlistFile = Exclude<z.output<typeof given>, { source: "pin-map" }>;

export const keepNetlistInput = z.object({
  project: z.string(),
  writeId,
  revisionId: z.uuid({ message: "Choose the revision that it is of." }),
  given,
});
export type KeepNetlistInput = z.output<typeof keepNetlistInput>;
