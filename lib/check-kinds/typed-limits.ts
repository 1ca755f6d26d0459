import { z } from "zod";
import { isUnit, parseLimits, type Limits, type Unit } from "@/lib/calc/units";

export const unitShape = z.custom<Unit>((value) => typeof value === "string" && isUnit(value), "Choose a unit.");

const deviationShape = z.object({ amount: z.number(), of: z.enum(["percent", "ppm", "unit"]) });

/** What was understood, as lib/calc/units has it. */
const limitsShape = z.object({
  unit: unitShape,
  lower: z.number().optional(),
  upper: z.number().optional(),
  lowerInclusive: z.boolean().optional(),
  upperInclusive: z.boolean().optional(),
  nominal: z.number().optional(),
  tolerance: z.object({ minus: deviationShape, plus: deviationShape }).optional(),
}) satisfies z.ZodType<Limits>;

/** Limits as they were typed, and as they were understood. */
export const typedLimitsShape = z.object({ typed: z.string(), value: limitsShape });
export type TypedLimits = z.infer<typeof typedLimitsShape>;

/** Reads limits in the given unit, or says at the given path of the form what is wrong with them. */
export function readLimits(typed: string, unit: Unit, context: z.RefinementCtx, path: PropertyKey[]): TypedLimits {
  const text = typed.trim();
  const parsed = text === "" ? NOTHING : parseLimits(text, unit);
  if (parsed.ok) return { typed: text, value: parsed.value };
  context.addIssue({ code: "custom", path, message: parsed.message });
  return { typed: text, value: { unit } };
}

const NOTHING = { ok: false as const, message: "Say what the reading may be, e.g. 4.75 … 5.25 V." };
