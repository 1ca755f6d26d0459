import erfc from "@stdlib/math-base-special-erfc";

/** Probability that a standard normal error exceeds z, precise far out in the tail. */
export const upperTail = (z: number): number => erfc(z / Math.SQRT2) / 2;

/** Bounds of the tolerance; a side left out is open. */
type Tolerance = { lower?: number; upper?: number };

/**
 * Probability that the true value lies outside the tolerance, for a reading with a normal error of standard
 * uncertainty u (same unit): both tails for a two-sided tolerance. This is the risk of accepting the reading wrongly.
 * With u = 0 it is 0 or 1; the bounds themselves are inside.
 * Source: JCGM 106:2012 §7.2–7.4 and §9.3.2 (specific risk), with no knowledge before the measurement; sections
 * from memory.
 */
export function probabilityOutside(
  reading: number,
  u: number,
  { lower = -Infinity, upper = Infinity }: Tolerance,
): number {
  if (u === 0) return reading < lower || reading > upper ? 1 : 0;
  const above = upper === Infinity ? 0 : upperTail((upper - reading) / u);
  const under = lower === -Infinity ? 0 : upperTail((reading - lower) / u);
  return Math.min(1, above + under);
}

/** Probability that the true value lies inside the tolerance: the conformance probability p_c (JCGM 106:2012 §7). */
export function probabilityInside(
  reading: number,
  u: number,
  { lower = -Infinity, upper = Infinity }: Tolerance,
): number {
  if (u === 0) return reading < lower || reading > upper ? 0 : 1;
  // Beyond a bound p_c is small: the difference of two tails on the same side keeps its digits.
  if (reading > upper) return Math.max(0, tailBetween((reading - upper) / u, (reading - lower) / u));
  if (reading < lower) return Math.max(0, tailBetween((lower - reading) / u, (upper - reading) / u));
  return 1 - probabilityOutside(reading, u, { lower, upper });
}

const tailBetween = (near: number, far: number): number => upperTail(near) - (far === Infinity ? 0 : upperTail(far));
