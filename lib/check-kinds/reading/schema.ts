import { z } from "zod";
import { isUnit, parseQuantity, type Unit } from "@/lib/calc/units";
import { readLimits, typedLimitsShape, unitShape } from "../typed-limits";

export const specShape = z.object({
  /** Base unit of the reading: V, A, Ω … */
  unit: unitShape,
  limits: typedLimitsShape,
  /** What a healthy board shows, for the builder's eye; the limits decide. */
  expected: z.object({ typed: z.string(), value: z.number() }).nullable(),
});
export type Spec = z.infer<typeof specShape>;

export const typedShape = z.object({ unit: z.string(), limits: z.string(), expected: z.string() });
export type Typed = z.infer<typeof typedShape>;

/** The figure as the builder wrote it: "4.98", "4k7", "2.2 µ". */
export const entryShape = z.object({ typed: z.string() });
export type Entry = z.infer<typeof entryShape>;

export const specFromTyped = typedShape.transform((typed, context): Spec => {
  const unit = typed.unit.trim();
  if (!isUnit(unit)) {
    context.addIssue({ code: "custom", path: ["unit"], message: "Choose the unit of the reading." });
    return z.NEVER;
  }
  return {
    unit,
    limits: readLimits(typed.limits, unit, context, ["limits"]),
    expected: readExpected(typed.expected, unit, context),
  };
});

function readExpected(typed: string, unit: Unit, context: z.RefinementCtx): Spec["expected"] {
  const text = typed.trim();
  if (text === "") return null;
  const parsed = parseQuantity(text, unit);
  if (parsed.ok) return { typed: text, value: parsed.value.value };
  context.addIssue({ code: "custom", path: ["expected"], message: parsed.message });
  return null;
}
