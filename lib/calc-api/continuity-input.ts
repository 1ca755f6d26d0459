import { z } from "zod";
import type { Netlist, NetPoint } from "@/lib/calc/netlist";
import { from, name, ohms } from "./fields";

export const MOST_POINTS = 3000;
const MOST_TEXT = 4_000_000;

const millimetres = from(-10_000, 10_000);

const point = z.strictObject({
  part: z.string().trim().max(40).describe("Reference of the part or connector: U1, J1."),
  pin: z.string().trim().min(1).max(20),
  kind: z.enum(["through", "surface", "via", "pin"]).default("pin"),
  side: z.enum(["both", "primary", "secondary", "inner"]).nullable().default(null),
  xMm: millimetres.nullable().default(null),
  yMm: millimetres.nullable().default(null),
  padMm: from(0, 100).nullable().default(null).describe("Diameter of the pad; null: not known."),
});

const net = z.strictObject({ name, points: z.array(point).min(1).max(MOST_POINTS) });

export const continuityInput = z.strictObject({
  nets: z.array(net).max(MOST_POINTS).default([]).describe("Nets by hand; or the text of a file below."),
  ipcD356: z.string().max(MOST_TEXT).default("").describe("Text of an IPC-D-356 or 356A file."),
  populated: z.boolean().default(true).describe("Parts are on the board: low voltage only, other limits apart."),
  limits: z
    .union([z.enum(["1", "2", "3", "3/A"]), z.strictObject({ continuityOhm: ohms, isolationOhm: ohms })])
    .default("1")
    .describe("A class of IPC-9252, or limits of one's own."),
  connector: z.string().trim().min(1).max(40).nullable().default(null).describe("Only what meets this connector."),
  signals: z
    .array(name)
    .max(MOST_POINTS)
    .nullable()
    .default(null)
    .describe("Only these nets and what lies beside them."),
  rails: z.array(name).max(200).default([]).describe("Rails besides those that their names give away."),
  railsOnly: z.boolean().default(false),
  results: z
    .array(
      z.strictObject({
        probe: z.int().min(0).max(10_000_000).describe("Id of a probe of this very plan."),
        beeps: z.boolean().nullable().default(null),
        ohm: from(0, 1e15).nullable().default(null).describe("What was read; an overload is beeps: false."),
      }),
    )
    .max(10 * MOST_POINTS)
    .default([])
    .describe("What probing said; with results the findings come along."),
});

type Given = z.output<typeof continuityInput>["nets"];

/** Nets of a request as a netlist; each name and each pin once. */
export function netlistOf(
  given: Given,
): { ok: true; netlist: Netlist } | { ok: false; fields: Record<string, string> } {
  const fields: Record<string, string> = {};
  const names = new Set<string>();
  const pins = new Set<string>();
  given.forEach((one, index) => {
    if (names.has(one.name)) fields[`nets.${index}.name`] = `${one.name} is there twice.`;
    names.add(one.name);
    one.points.forEach(({ part, pin }, at) => {
      const key = `${part} ${pin}`;
      if (pins.has(key)) fields[`nets.${index}.points.${at}`] = `${part} ${pin} is on a net already.`;
      pins.add(key);
    });
  });
  if (Object.keys(fields).length > 0) return { ok: false, fields };
  const nets = given.map((one) => ({ name: one.name, points: one.points.map(pointOf) }));
  const isPlaced = nets.some(({ points }) => points.some(({ xMm, yMm }) => xMm !== null && yMm !== null));
  const rest = { unconnected: [], adjacent: [], outlines: [], toolingHoles: [], facts: [] };
  return { ok: true, netlist: { source: "pin-list", nets, places: isPlaced ? "board" : "none", ...rest } };
}

const pointOf = ({ padMm, ...point }: Given[number]["points"][number]): NetPoint => ({
  ...point,
  ...{ isMidPoint: false, holeMm: null, isPlated: null, turnDeg: null, mask: null, line: 0 },
  ...{ padWidthMm: padMm, padHeightMm: null },
});
