/** Of a list with at least one number; the mean of the two in the middle where there is no middle one. */
export function median(values: readonly number[]): number {
  const sorted = [...values].sort((a, b) => a - b);
  const middle = sorted.length / 2;
  const [below, above] = [sorted[Math.ceil(middle) - 1] ?? NaN, sorted[Math.floor(middle)] ?? NaN];
  return (below + above) / 2;
}

/** The smallest value that at least `share` of them do not exceed (nearest rank). */
export function quantile(values: readonly number[], share: number): number {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted[Math.max(0, Math.ceil(share * sorted.length) - 1)] ?? NaN;
}
