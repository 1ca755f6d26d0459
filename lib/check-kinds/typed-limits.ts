import { z } from "zod";
import { parseLimits } from "@/lib/calc/units";

/** Limits as they were typed, and what was understood: in the base unit, null where there is none. */
export const typedLimitsShape = z.object({
  typed: z.string(),
  lower: z.number().nullable(),
  upper: z.number().nullable(),
});
export type TypedLimits = z.infer<typeof typedLimitsShape>;

const LONGEST = 80;

/** Reads limits in the given unit, or says at the given path of the form what is wrong with them. */
export function readLimits(typed: string, unit: string, context: z.RefinementCtx, path: PropertyKey[]): TypedLimits {
  const text = typed.trim();
  const parsed = text.length > LONGEST ? TOO_LONG : parseLimits(text, unit);
  if (!parsed.ok) {
    context.addIssue({ code: "custom", path, message: parsed.message });
    return { typed: text, lower: null, upper: null };
  }
  return { typed: text, lower: parsed.value.lower ?? null, upper: parsed.value.upper ?? null };
}

const TOO_LONG = { ok: false as const, message: `At most ${LONGEST} characters fit here.` };
