import type { PointPairs } from "./chains";
import type { ProbeLimits } from "./limits";
import type { Probe } from "./plan";
import type { PointBook } from "./point-book";

/**
 * Numbers the probes and says which tip goes where, so that each tip moves as little as it can. `travelMm` is the way of both tips
 * together, null when no place is known.
 */
export function layProbes(
  { x, y }: PointBook,
  joined: PointPairs,
  apart: PointPairs,
  limits: ProbeLimits,
): { probes: Probe[]; travelMm: number | null } {
  const probes: Probe[] = [];
  let travelMm = 0;
  let isKnown = false;
  let [lastA, lastB] = [-1, -1];
  /** How far two places are apart; nothing is known of one that has none. */
  const way = (one: number, other: number): number => {
    const [dx, dy] = [(x[one] ?? Number.NaN) - (x[other] ?? 0), (y[one] ?? 0) - (y[other] ?? 0)];
    return Number.isNaN(dx) ? 0 : Math.sqrt(dx * dx + dy * dy);
  };
  const lay = (kind: "continuity" | "isolation", pairs: PointPairs) => {
    const [expect, limitOhm] =
      kind === "continuity" ? (["joined", limits.continuityOhm] as const) : (["apart", limits.isolationOhm] as const);
    for (let at = 0; at < pairs.a.length; at += 1) {
      const [one, other] = [pairs.a[at] ?? 0, pairs.b[at] ?? 0];
      const straight = way(lastA, one) + way(lastB, other);
      const swapped = way(lastA, other) + way(lastB, one);
      const [a, b] = swapped < straight ? [other, one] : [one, other];
      travelMm += Math.min(straight, swapped);
      isKnown ||= !Number.isNaN(x[one]);
      probes.push({ id: probes.length, kind, a, b, expect, limitOhm });
      [lastA, lastB] = [a, b];
    }
  };
  lay("continuity", joined);
  lay("isolation", apart);
  return { probes, travelMm: isKnown ? travelMm : null };
}
