import { formatQuantity, parseQuantity } from "@/lib/calc/units";
import type { Entry, Spec } from "./schema";

/** With the digits that were read: 5.00 V, not 5 V. */
export function summary(spec: Spec, entry: Entry): string {
  const parsed = parseQuantity(entry.typed, spec.unit);
  return parsed.ok ? formatQuantity(parsed.value, { resolution: parsed.digits.resolution }) : entry.typed;
}
