import type { PointPairs } from "./chains";
import type { ProbeLimits } from "./limits";
import type { Probe } from "./plan";
import type { PointBook } from "./point-book";

/**
 * Numbers the probes and says which tip goes where, so that each tip moves as little as it can. `travelMm` is the way of both tips
 * together, null when no place is known.
 */
export function layProbes(
  book: PointBook,
  joined: PointPairs,
  apart: PointPairs,
  limits: ProbeLimits,
): { probes: Probe[]; travelMm: number | null } {
  const probes: Probe[] = [];
  const first = layKind(book, joined, { kind: "continuity", expect: "joined", limitOhm: limits.continuityOhm }, probes);
  const second = layKind(book, apart, { kind: "isolation", expect: "apart", limitOhm: limits.isolationOhm }, probes);
  const isKnown = probes.some(({ a }) => !Number.isNaN(book.x[a]));
  return { probes, travelMm: isKnown ? first + second : null };
}

/** Adds the probes behind those that are there, and answers the way of both tips. */
function layKind(
  { x, y }: PointBook,
  pairs: PointPairs,
  { kind, expect, limitOhm }: Pick<Probe, "kind" | "expect" | "limitOhm">,
  probes: Probe[],
): number {
  let travel = 0;
  let lastA = probes.at(-1)?.a ?? -1;
  let lastB = probes.at(-1)?.b ?? -1;
  for (let at = 0; at < pairs.a.length; at += 1) {
    const one = pairs.a[at] ?? 0;
    const other = pairs.b[at] ?? 0;
    const straight = way(x, y, lastA, one) + way(x, y, lastB, other);
    const swapped = way(x, y, lastA, other) + way(x, y, lastB, one);
    const isSwapped = swapped < straight;
    travel += isSwapped ? swapped : straight;
    lastA = isSwapped ? other : one;
    lastB = isSwapped ? one : other;
    probes.push({ id: probes.length, kind, a: lastA, b: lastB, expect, limitOhm });
  }
  return travel;
}

/** How far two points are apart; 0 when nothing is known of one of them. */
function way(x: Float64Array, y: Float64Array, one: number, other: number): number {
  if (one < 0) return 0;
  const dx = (x[one] ?? 0) - (x[other] ?? 0);
  const dy = (y[one] ?? 0) - (y[other] ?? 0);
  const length = Math.sqrt(dx * dx + dy * dy);
  return Number.isNaN(length) ? 0 : length;
}
