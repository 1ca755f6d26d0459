/** Roundings by which two ways to work out the same number may differ; far below what any instrument resolves. */
const ROUNDINGS = 4;

/** The same number but for rounding. `scale` is the largest number that went into either, when that was larger. */
export function same(a: number, b: number, scale = 0): boolean {
  if (a === b) return true;
  const largest = Math.max(Math.abs(a), Math.abs(b), Math.abs(scale));
  return Number.isFinite(largest) && Math.abs(a - b) <= ROUNDINGS * Number.EPSILON * largest;
}

/** a ≤ b, rounding forgiven: 0.1 + 0.2 is at most 0.3. */
export const atMost = (a: number, b: number, scale = 0): boolean => a < b || same(a, b, scale);

/** a < b beyond rounding: 0.1 + 0.2 is not below 0.3 and 0.3 is not below 0.1 + 0.2. */
export const below = (a: number, b: number, scale = 0): boolean => a < b && !same(a, b, scale);
