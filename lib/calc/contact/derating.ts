import { computed, fault, type Computed } from "../computed";
import { formatQuantity } from "../units";

/** Ambient temperature in °C and the current that a contact bears there, A; ascending in temperature. */
export type DeratingPoint = { ambientC: number; currentA: number };

/**
 * A two-part connector on the 2.54 mm grid (DIN 41612, IEC 60603-2): read in the makers' sheets of half-size types
 * (16 to 48 ways; no sheet of a full-size one could be opened), for a contact with all its neighbours loaded alike.
 */
export const TWO_PART_DERATING: readonly [DeratingPoint, ...DeratingPoint[]] = [
  { ambientC: 20, currentA: 2 },
  { ambientC: 70, currentA: 1 },
  { ambientC: 100, currentA: 0.5 },
];

/** Lower end of the category temperature of such connectors, °C, from memory. */
const COLDEST_C = -55;

/**
 * Current that one contact bears at an ambient temperature, A: straight lines between the points of the curve, a
 * modelling choice (the real curve is bent). Below the first point the current of the first point.
 * Refused above the last point, where a sheet promises nothing.
 */
export function contactCurrentA(
  ambientC: number,
  curve: readonly [DeratingPoint, ...DeratingPoint[]] = TWO_PART_DERATING,
): Computed<number> {
  if (!Number.isFinite(ambientC)) return fault("ambientC", "The temperature is no number.");
  const [first] = curve;
  const last = curve.at(-1) ?? first;
  if (ambientC > last.ambientC || ambientC < COLDEST_C) {
    const range = `from ${celsius(COLDEST_C)} to ${celsius(last.ambientC)}`;
    return fault("ambientC", `The contacts' current is known ${range}, not at ${celsius(ambientC)}.`);
  }
  const above = curve.findIndex((point) => point.ambientC >= ambientC);
  const [from, to] = [curve[above - 1] ?? first, curve[above] ?? last];
  if (to.ambientC <= from.ambientC) return computed(to.currentA);
  const share = (ambientC - from.ambientC) / (to.ambientC - from.ambientC);
  return computed(from.currentA + share * (to.currentA - from.currentA));
}

export const celsius = (value: number): string => formatQuantity({ value, unit: "°C" });
