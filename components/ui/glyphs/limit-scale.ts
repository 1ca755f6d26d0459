export type Limits = { lower?: number | undefined; upper?: number | undefined };

export type LimitScale = {
  /** Position on the bar, 0 … 1; values off the scale land on its end. */
  at: (value: number) => number;
  isOff: (value: number) => "below" | "above" | null;
  low: number;
  high: number;
};

const MARGIN = 0.28;

/**
 * What the bar shows: the limits with some room outside them. A limit alone gets the other end from zero when that is
 * on its open side, else from its own size, so that "below 0.5" runs from 0 and "above 1 M" runs to 2 M.
 */
export function limitScale({ lower, upper }: Limits): LimitScale {
  const [from, to] = ends(lower, upper);
  const room = (to - from || Math.abs(to) || 1) * MARGIN;
  const low = lower === undefined ? from : from - room;
  const high = upper === undefined ? to : to + room;
  const span = high - low || 1;
  return {
    low,
    high,
    at: (value) => Math.min(1, Math.max(0, (value - low) / span)),
    isOff: (value) => (value < low ? "below" : value > high ? "above" : null),
  };
}

function ends(lower: number | undefined, upper: number | undefined): [number, number] {
  if (lower !== undefined && upper !== undefined) return [lower, upper];
  if (upper !== undefined) return upper > 0 ? [0, upper] : [2 * upper || -1, upper];
  if (lower !== undefined) return lower < 0 ? [lower, 0] : [lower, 2 * lower || 1];
  return [0, 1];
}

export type Standing = "inside" | "guard" | "outside";

/** Where a value stands to the limits. `guard` is the width of the band inside each limit. */
export function standing(value: number, { lower, upper }: Limits, guard = 0): Standing {
  if (lower !== undefined && value < lower) return "outside";
  if (upper !== undefined && value > upper) return "outside";
  if (lower !== undefined && value < lower + guard) return "guard";
  if (upper !== undefined && value > upper - guard) return "guard";
  return "inside";
}
