import { z } from "zod";
import { computed, type Computed } from "@/lib/calc/computed";
import { familyAt, type Group } from "@/lib/calc/levels";
import { judgePullUp, lineOf, pullUpWindow, type Line, type RiseDefinition } from "@/lib/calc/pull-up";
import { defineCalculation, faulty, type Outcome } from "./define-calculation";
import { familyField, familyOf } from "./family-field";
import { amps, countFromZero, ohms, percent, picofarads, seconds, volts, voltsFromZero } from "./fields";

const group = z.strictObject({ family: familyField, count: countFromZero.default(1) });

const DEFINITIONS: Record<"10-90" | "20-80" | "30-70", RiseDefinition> = {
  "10-90": "10–90 %",
  "20-80": "20–80 %",
  "30-70": "30–70 %",
};

const input = z
  .strictObject({
    supply: z.strictObject({ minVolts: volts, maxVolts: volts }),
    line: z
      .strictObject({
        highVolts: volts,
        lowVolts: voltsFromZero,
        sinkA: amps,
        leakageA: amps.default(0),
        inputsHighA: amps.default(0),
        inputsLowA: amps.default(0),
      })
      .optional()
      .describe("The data sheets' figures, summed over all outputs and inputs; currents as magnitudes."),
    parts: z
      .strictObject({
        outputs: z.array(group).min(1).max(50),
        inputs: z.array(group).max(50).default([]),
        marginVolts: voltsFromZero.max(10).default(0),
      })
      .optional()
      .describe("Or the families that hang on the line."),
    capacitancePf: picofarads.default(0),
    definition: z.enum(["10-90", "20-80", "30-70"]).default("10-90").describe("Per cent of the step that is timed."),
    riseLimitS: seconds.nullable().default(null),
    tolerancePercent: percent.max(50).default(0).describe("Of the resistor."),
    ohm: ohms.nullable().default(null).describe("A resistor to judge; null: only the window."),
  })
  .refine(({ line, parts }) => (line === undefined) !== (parts === undefined), {
    message: "Give either the figures of the line or the families on it.",
    path: ["line"],
  });
type Input = z.output<typeof input>;

export const pullUp = defineCalculation({
  name: "pull-up",
  about: "The resistors that pull an open-drain line up well, values of the E series, and what one of them does.",
  source:
    "Rmin = (VCC,max − VOL) / (IOL − Σ|IIL|), Rmax = (VCC,min − VIH) / (Σ IOZ + Σ IIH): formulas of the makers' sheets. Rise 30 to 70 %: 0.8473 RC (UM10204, eq. 1 and 2). Values: IEC 60063.",
  leavesOut: "Ringing, a line longer than a quarter of the edge, hot-plugging.",
  most: "50 groups of outputs and of inputs.",
  input,
  example: {
    supply: { minVolts: 3.3, maxVolts: 3.3 },
    line: { highVolts: 2.31, lowVolts: 0.4, sinkA: 0.003 },
    capacitancePf: 200,
    definition: "30-70",
    riseLimitS: 300e-9,
    ohm: 1500,
  },
  run: (given): Outcome => {
    const line = lineFrom(given);
    if (!line.ok) return faulty(line);
    const window = pullUpWindow(line.value);
    if (!window.ok) return faulty(window, fieldOf(window.field, given));
    if (given.ohm === null) return { ok: true, result: { window: window.value, judgement: null } };
    const judged = judgePullUp(line.value, given.ohm);
    return judged.ok ? { ok: true, result: { window: window.value, judgement: judged.value } } : faulty(judged);
  },
});

function lineFrom(given: Input): Computed<Line> {
  const { supply, capacitancePf, riseLimitS, tolerancePercent } = given;
  const conditions = { supply, capacitancePf, riseLimitS, tolerancePercent };
  const definition = DEFINITIONS[given.definition];
  if (given.line) return computed({ ...conditions, definition, ...given.line });
  const { outputs, inputs, marginVolts } = given.parts ?? { outputs: [], inputs: [], marginVolts: 0 };
  const groups: Record<"outputs" | "inputs", Group[]> = { outputs: [], inputs: [] };
  for (const side of ["outputs", "inputs"] as const) {
    for (const [index, { family, count }] of (side === "outputs" ? outputs : inputs).entries()) {
      const field = `parts.${side}.${index}.family`;
      const found = familyOf(field, family);
      if (!found.ok) return found;
      const moved = familyAt(found.value, supply.minVolts);
      if (!moved.ok) return { ...moved, field };
      groups[side].push({ family: moved.value, count });
    }
  }
  return lineOf(groups.outputs, groups.inputs, { ...conditions, definition, marginVolts });
}

/** Where a figure of the line stands in the input. */
function fieldOf(field: string, { line }: Input): string {
  if (field === "minVolts" || field === "maxVolts") return "supply";
  return line && Object.hasOwn(line, field) ? "line" : "";
}
