import { isUnit, type Limits } from "@/lib/calc/units";
import type { TypedLimits } from "./typed-limits";

/** Stored limits as the calculations take them. */
export function limitsOf(stored: TypedLimits, unit: string): Limits {
  return { unit: isUnit(unit) ? unit : "", lower: stored.lower ?? undefined, upper: stored.upper ?? undefined };
}
