import { formatQuantity, isUnit } from "@/lib/calc/units";
import type { DecisionRule } from "@/db/schema/projects";

type Drawn = {
  lower: number | undefined;
  upper: number | undefined;
  guard: number | undefined;
  format: (value: number) => string;
};

/** A figure with its unit; one of a unit that is no longer known is still written. */
export function figure(value: number, unit: string): string {
  return isUnit(unit) ? formatQuantity({ value, unit }) : `${value} ${unit}`;
}

/** What the drawing of the limits takes. Guard bands are drawn only where the project's rule uses them. */
export function drawnLimits(
  limits: { lower?: number | null | undefined; upper?: number | null | undefined },
  unit: string,
  expandedUncertainty: number | null,
  rule: DecisionRule,
): Drawn {
  return {
    lower: limits.lower ?? undefined,
    upper: limits.upper ?? undefined,
    guard: rule === "guarded" ? (expandedUncertainty ?? undefined) : undefined,
    format: (value) => figure(value, unit),
  };
}
