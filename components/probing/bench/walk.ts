export const HALVES = ["all", "first", "second"] as const;
/** Two people share a round: each begins at an end and walks towards the other. */
export type Half = (typeof HALVES)[number];

/** How many probes a part has, and which one stands at a place of its walk. */
export function walkOf(count: number, half: Half): { length: number; at: (place: number) => number } {
  const middle = Math.ceil(count / 2);
  if (half === "first") return { length: middle, at: (place) => place };
  if (half === "second") return { length: count - middle, at: (place) => count - 1 - place };
  return { length: count, at: (place) => place };
}

/** Where a probe stands on the walk; undefined when it belongs to the other half. */
export function placeOf(count: number, half: Half, probe: number): number | undefined {
  const middle = Math.ceil(count / 2);
  if (half === "second") return probe >= middle && probe < count ? count - 1 - probe : undefined;
  return probe >= 0 && probe < (half === "first" ? middle : count) ? probe : undefined;
}

/** The first probe without an answer after a place, from the beginning again when there is none; undefined when all are answered. */
export function nextOpen(
  count: number,
  half: Half,
  isAnswered: (probe: number) => boolean,
  after: number,
): number | undefined {
  const { length, at } = walkOf(count, half);
  for (let step = 1; step <= length; step += 1) {
    const probe = at((after + step + length) % length);
    if (!isAnswered(probe)) return probe;
  }
  return undefined;
}
