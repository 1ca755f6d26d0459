import { type Limits } from "../units";
import { atMost, below } from "./compare";

/** Where a reading has to lie to be accepted. Empty when the guard bands of both sides meet: w > T/2. */
export type Acceptance = { lower?: number; upper?: number; empty: boolean };

/** The limits drawn in by the guard band w on every side (JCGM 106:2012 §8.3.2, section from memory). */
export function acceptanceZone({ lower, upper, lowerInclusive, upperInclusive }: Limits, w: number): Acceptance {
  const zone = {
    lower: lower === undefined ? undefined : lower + w,
    upper: upper === undefined ? undefined : upper - w,
  };
  if (zone.lower === undefined || zone.upper === undefined) return { ...zone, empty: false };
  const scale = Math.max(Math.abs(lower ?? 0), Math.abs(upper ?? 0), w);
  const closed = lowerInclusive !== false && upperInclusive !== false;
  const some = closed ? atMost(zone.lower, zone.upper, scale) : below(zone.lower, zone.upper, scale);
  return { ...zone, empty: !some };
}

/** Whether the limits, drawn in by w, hold a value. A value on an included bound is inside, rounding forgiven. */
export function holds(
  { lower, upper, lowerInclusive, upperInclusive, nominal }: Limits,
  value: number,
  w = 0,
): boolean {
  const scaleOf = (bound: number) => Math.max(Math.abs(bound), Math.abs(nominal ?? 0), w);
  const above = (bound: number) =>
    lowerInclusive === false ? below(bound + w, value, scaleOf(bound)) : atMost(bound + w, value, scaleOf(bound));
  const under = (bound: number) =>
    upperInclusive === false ? below(value, bound - w, scaleOf(bound)) : atMost(value, bound - w, scaleOf(bound));
  return (lower === undefined || above(lower)) && (upper === undefined || under(upper));
}
