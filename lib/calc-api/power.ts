import { z } from "zod";
import { boardPower, currentWindows, machinePower } from "@/lib/calc/power";
import { defineCalculation, faulty, type Outcome } from "./define-calculation";
import { amps, celsius, countFromZero, from, name, ohms, percent, spreadTo } from "./fields";
import { itemsOf, powerItem } from "./power-items";

const rail = z.strictObject({
  name,
  volts: from(-10_000, 10_000).describe("With its sign; not 0."),
  tolerancePercent: percent.max(50).default(5),
});
const draw = z.strictObject({ rail: name, typicalA: amps, worstA: amps });

const board = z
  .strictObject({
    items: z.array(powerItem).max(1000).default([]),
    typed: z.array(draw).max(50).default([]).describe("Measured for the whole board; stands instead of the sum."),
    elsewhere: z.array(draw).max(50).default([]).describe("What other boards take from rails that this one makes."),
  })
  .describe("One board: its current from each rail, and the window for its first power.");

const machine = z
  .strictObject({
    capacities: z.record(name, amps.min(1e-9)).default({}).describe("What each supply gives at most, by rail."),
    sources: z.record(name, name).default({}).describe("Placement that feeds a rail, by rail."),
    placements: z
      .array(
        z.strictObject({
          id: name,
          slot: z.int().min(0).max(999).nullable().default(null),
          draws: z.array(draw).max(50).default([]),
          heatW: spreadTo(1e6).nullable().default(null),
          contacts: z
            .strictObject({
              rails: z.array(z.strictObject({ rail: name, count: countFromZero })).max(50),
              ground: countFromZero,
            })
            .nullable()
            .default(null),
        }),
      )
      .max(200),
    ambientC: celsius.default(40),
    backplane: z
      .array(
        z.strictObject({
          rail: name,
          supplyOhm: ohms.max(1e6),
          groundOhm: ohms.max(1e6),
          contactOhm: ohms.max(1e3).default(0.02),
          sourceSlot: z.int().min(0).max(999).default(0),
        }),
      )
      .max(50)
      .default([]),
  })
  .describe("The assembled machine: margins of the supplies, current per contact, drop along the backplane.");

const input = z
  .strictObject({ rails: z.array(rail).min(1).max(50), board: board.optional(), machine: machine.optional() })
  .refine(({ board: one, machine: all }) => one !== undefined || all !== undefined, {
    message: "Give a board, a machine, or both.",
    path: ["board"],
  });
type Input = z.output<typeof input>;

export const power = defineCalculation({
  name: "power",
  about: "Current of a board from its rails with the window for its first power, and the power of a whole machine.",
  source:
    "PD = Cpd · VCC² · fi · N + Σ CL · VCC² · fo: makers' sheets (NXP 74HC283, TI SCAA035B). Contacts: IEC 60603-2 derating as read in data sheets, 2 A at 20 °C, 1 A at 70 °C, 0.5 A at 100 °C. Copper: 1.72e-8 Ω m. Window and supply limit: common practice, no source.",
  leavesOut: "Inrush, short-circuit currents, glitches, currents of other rails in the same ground.",
  most: "1,000 items on a board, 200 placements.",
  input,
  example: {
    rails: [{ name: "+5V", volts: 5, tolerancePercent: 5 }],
    board: {
      items: [
        { kind: "part", number: "283", family: "HC", rail: "+5V", count: 4, gatesUsed: 4, clockHz: 1_843_200 },
        {
          ...{ kind: "led", label: "Phase lamps", rail: "+5V", count: 8, forwardVolts: 2, ohm: 470 },
          lit: { typical: 0.5, worst: 1 },
        },
      ],
    },
    machine: {
      capacities: { "+5V": 3 },
      placements: [
        {
          ...{ id: "CON-01", slot: 3, draws: [{ rail: "+5V", typicalA: 0.2, worstA: 0.4 }] },
          contacts: { rails: [{ rail: "+5V", count: 2 }], ground: 7 },
        },
      ],
    },
  },
  run: ({ rails, board: one, machine: all }): Outcome => {
    const result: { board?: object; windows?: object; machine?: object } = {};
    if (one) {
      const items = itemsOf(one.items);
      if (!items.ok) return faulty(items, "board");
      const worked = boardPower({ items: items.value, rails, typed: one.typed, elsewhere: one.elsewhere });
      if (!worked.ok) return faulty(worked, worked.field.startsWith("rails") ? "" : "board");
      result.board = worked.value;
      result.windows = currentWindows(worked.value);
    }
    if (all) {
      const worked = machinePower(machineInput(rails, all));
      if (!worked.ok) return faulty(worked, worked.field.startsWith("rails") ? "" : "machine");
      result.machine = worked.value;
    }
    return { ok: true, result };
  },
});

function machineInput(rails: Input["rails"], all: NonNullable<Input["machine"]>) {
  const { capacities, sources, placements, ambientC, backplane } = all;
  const find = <Value>(by: Record<string, Value>, key: string) =>
    (Object.hasOwn(by, key) ? by[key] : undefined) ?? null;
  return {
    rails: rails.map((one) => ({
      ...one,
      capacityA: find(capacities, one.name),
      sourcePlacement: find(sources, one.name),
    })),
    placements: placements.map((one) => ({ ...one, label: one.id, board: one.id })),
    ambientC,
    backplane,
  };
}
