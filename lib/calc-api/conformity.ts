import { z } from "zod";
import { judge, JudgementError } from "@/lib/calc/conformity";
import { UNITS } from "@/lib/calc/units";
import { defineCalculation, type Outcome } from "./define-calculation";
import { from } from "./fields";

const figure = from(-1e30, 1e30);
const magnitude = from(0, 1e30);

const input = z.strictObject({
  reading: figure.describe("In the base unit: 4.98 V is 4.98, 120 mA is 0.12."),
  unit: z
    .enum(UNITS.map(({ unit }) => unit))
    .default("V")
    .describe("Base unit by its symbol, without a prefix; empty for a plain number."),
  limits: z.strictObject({
    lower: figure.optional(),
    upper: figure.optional(),
    lowerInclusive: z.boolean().default(true),
    upperInclusive: z.boolean().default(true),
  }),
  accuracy: z
    .strictObject({
      percentOfReading: magnitude.default(0),
      counts: magnitude.default(0),
      resolution: magnitude.default(0).describe("One count of the range in use, in the base unit."),
      percentOfRange: magnitude.default(0),
      range: magnitude.optional().describe("Full scale of the range in use, in the base unit."),
    })
    .optional(),
  rule: z.enum(["simple", "guarded"]).default("guarded"),
  model: z.enum(["rectangular", "limit"]).default("rectangular"),
});

export const conformity = defineCalculation({
  name: "conformity",
  about: "Judges a reading against limits, with the instrument's accuracy.",
  source:
    "Guarded acceptance with w = U: JCGM 106:2012, ISO 14253-1, ILAC-G8:09/2019. U = 2a/√3 from the maker's limit of error a: GUM (JCGM 100:2008) 4.3.7. The documents were not opened; see the project's check values.",
  leavesOut: "What is known of the circuit before measuring, repeated readings, loading, drift since calibration.",
  most: "One reading.",
  input,
  example: {
    reading: 5.2,
    unit: "V",
    limits: { lower: 4.75, upper: 5.25 },
    accuracy: { percentOfReading: 0.5, counts: 2, resolution: 0.01 },
    rule: "guarded",
  },
  run: ({ reading, unit, limits, accuracy, rule, model }): Outcome => {
    const { lower, upper, ...inclusive } = limits;
    const bounds = { ...(lower === undefined ? {} : { lower }), ...(upper === undefined ? {} : { upper }) };
    const instrument = accuracy && accuracyOf(accuracy);
    try {
      const result = judge({
        reading: { value: reading, unit },
        limits: { unit, ...bounds, ...inclusive },
        ...(instrument ? { accuracy: instrument } : {}),
        ...{ rule, model },
      });
      return { ok: true, result };
    } catch (error) {
      if (!(error instanceof JudgementError)) throw error;
      return { ok: false, fields: { [error.about]: error.message } };
    }
  },
});

function accuracyOf({ range, ...figures }: NonNullable<z.output<typeof input>["accuracy"]>) {
  return range === undefined ? figures : { ...figures, range };
}
