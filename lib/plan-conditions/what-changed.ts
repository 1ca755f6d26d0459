import { formatQuantity } from "@/lib/calc/units";
import type { Conditions } from "./schema";

type Values = Omit<Conditions, "version">;

const WORDS: { [Name in keyof Values]: (values: Values) => string } = {
  ambientC: ({ ambientC }) => `air at ${formatQuantity({ value: ambientC, unit: "°C" })}`,
  logicVolts: ({ logicVolts }) => `logic at ${formatQuantity({ value: logicVolts, unit: "V" })}`,
  logicRail: ({ logicRail }) => `logic from ${logicRail}`,
  pinCapacitancePf: ({ pinCapacitancePf }) => `${pinCapacitancePf}\u202fpF a connector pin`,
  sparesPercent: ({ sparesPercent }) => `${sparesPercent}\u202f% spares`,
  currency: ({ currency }) => `prices in ${currency}`,
};

/** "air at 50 °C, logic from +3V3": what a change of the conditions amounts to; empty when nothing did. */
export function whatChanged(before: Values, after: Values): string {
  // Object.keys() gives the very keys of the record; the compiler widens them to string.
  const names = Object.keys(WORDS) as (keyof Values)[];
  return names
    .filter((name) => before[name] !== after[name])
    .map((name) => WORDS[name](after))
    .join(", ");
}
