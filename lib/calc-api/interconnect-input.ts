import { z } from "zod";
import { CONNECTOR_IDS } from "@/lib/calc/connector";
import { PIN_ROLES, SIGNAL_CLASSES } from "@/lib/calc/interconnect";
import { amps, celsius, countFromZero, from, hertz, name, ohms, percent, picofarads, volts } from "./fields";

export const MOST_CONNECTORS = 200;
export const MOST_PINS = 200;

const signal = z.string().trim().max(60);

const pin = z.strictObject({
  pin: z.string().trim().min(1).max(10).describe("The standard's name: a4, 17."),
  signal: signal.default(""),
  role: z.enum(PIN_ROLES),
  family: z.string().trim().max(40).default(""),
  loads: countFromZero.default(0),
  enableGroup: z.string().trim().max(40).default(""),
  pullUpOhm: ohms.nullable().default(null),
});

const connector = z.strictObject({
  reference: name.describe("As printed on the board: J1."),
  type: z.enum([...CONNECTOR_IDS, "grid"]),
  grid: z
    .strictObject({
      rows: z.array(z.string().max(3)).min(1).max(26),
      positions: z.int().min(1).max(200),
      pitchMm: from(0, 100),
    })
    .nullable()
    .default(null)
    .describe('Only with the type "grid".'),
  pins: z.array(pin).max(MOST_PINS),
});

const at = z.strictObject({ placement: name, connector: name.describe("Its reference on that board.") });

export const machineInput = z.strictObject({
  boards: z
    .array(
      z.strictObject({
        code: name,
        kind: z.enum(["card", "backplane"]).default("card"),
        connectors: z.array(connector).min(1).max(MOST_CONNECTORS),
      }),
    )
    .min(1)
    .max(MOST_CONNECTORS),
  placements: z
    .array(z.strictObject({ id: name, board: name, slot: z.int().min(0).max(999).nullable().default(null) }))
    .max(MOST_CONNECTORS)
    .default([])
    .describe("Where each board stands; left away, each stands once, under its code."),
  matings: z
    .array(z.strictObject({ from: at, to: at }))
    .max(2 * MOST_CONNECTORS)
    .default([]),
  signals: z
    .array(
      z.strictObject({
        name: signal.min(1),
        class: z.enum(SIGNAL_CLASSES).default("data"),
        aliases: z.array(signal.min(1)).max(20).default([]),
        frequencyHz: hertz.nullable().default(null),
      }),
    )
    .max(5000)
    .default([]),
  rails: z
    .array(
      z.strictObject({
        name: signal.min(1),
        volts: from(-1e4, 1e4),
        tolerancePercent: percent.default(5),
      }),
    )
    .max(50)
    .default([]),
  draws: z
    .array(z.strictObject({ placement: name, rail: name, typicalA: amps.default(0), worstA: from(-1e4, 1e4) }))
    .max(2000)
    .default([])
    .describe("Current of a placement from a rail; below zero where it feeds the rail."),
  conditions: z
    .strictObject({
      ambientC: celsius.default(40),
      logicVolts: volts.default(5),
      logicRail: signal.default("+5V"),
      pinCapacitancePf: picofarads.default(5),
    })
    .default({ ambientC: 40, logicVolts: 5, logicRail: "+5V", pinCapacitancePf: 5 }),
});
export type MachineGiven = z.output<typeof machineInput>;
