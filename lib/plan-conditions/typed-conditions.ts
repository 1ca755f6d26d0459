import { formatQuantity, type Unit } from "@/lib/calc/units";
import type { Conditions } from "./schema";

const write = (value: number, unit: Unit) => formatQuantity({ value, unit });

/** The conditions as their form holds them. */
export const typedConditions = (conditions: Conditions) => ({
  ambientC: write(conditions.ambientC, "°C"),
  logicVolts: write(conditions.logicVolts, "V"),
  logicRail: conditions.logicRail,
  pinCapacitancePf: write(Number((conditions.pinCapacitancePf / 1e12).toPrecision(9)), "F"),
  sparesPercent: write(conditions.sparesPercent, "%"),
  currency: conditions.currency,
});
