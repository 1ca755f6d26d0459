import { type Limits } from "../units";

/** One part in four: the test uncertainty ratio of 4:1 that calibration practice asks for. */
const COARSE_ABOVE = 1 / 4;

/**
 * U as a share of the tolerance, in the same unit. Undefined when there is nothing to compare with.
 *
 * For two-sided limits the tolerance is the **half-width** T/2, the 0.25 V of 5 V ± 0.25 V: U is a half-width too, and
 * the ratio of the two is what a 4:1 rule compares. A one-sided limit has no width; U is compared with |limit|, which
 * says when the instrument can hardly tell the limit from nothing. A one-sided limit at 0, or a width of 0, gives nothing.
 * Source: common practice; the same figure as a measurement capability index of 4 in JCGM 106:2012 §7.6, from memory.
 */
export function shareOfTolerance(expandedUncertainty: number, { lower, upper }: Limits): number | undefined {
  const twoSided = lower !== undefined && upper !== undefined;
  const tolerance = twoSided ? (upper - lower) / 2 : Math.abs(lower ?? upper ?? 0);
  return tolerance > 0 ? expandedUncertainty / tolerance : undefined;
}

/** True when U is more than a quarter of the tolerance. */
export const isTooCoarse = (share: number | undefined): boolean =>
  share !== undefined && share > COARSE_ABOVE * (1 + 4 * Number.EPSILON);
