/** Percentages are taken to the hundredth, so that 7 % of 100 is 7 and not 8 by a rounding error. */
const HUNDREDTHS = 100;

/** Spares of a part: so many per cent of what is needed, rounded up, and at least the minimum; none of what is not needed. */
export function countSpares(needed: number, percent: number, minimum: number): number {
  if (needed === 0) return 0;
  return Math.max(Math.ceil((needed * Math.round(percent * HUNDREDTHS)) / (100 * HUNDREDTHS)), minimum);
}
