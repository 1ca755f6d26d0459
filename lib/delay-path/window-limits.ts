import type { DelayWindow } from "@/lib/calc/delay";
import { formatLimits } from "@/lib/calc/units";

const DIGITS = 3;

/**
 * The window as limits of a check, rounded outwards to three digits of its larger bound: what was worked out must not be
 * shut out. Undefined when it is open on both sides.
 */
export function windowLimits({ lowerS, upperS }: DelayWindow): string | undefined {
  const larger = Math.max(lowerS ?? 0, upperS ?? 0);
  if (lowerS === null && upperS === null) return undefined;
  const exponent = larger === 0 ? 0 : Math.floor(Math.log10(larger)) - DIGITS + 1;
  return formatLimits({
    unit: "s",
    ...(lowerS === null ? {} : { lower: rounded(lowerS, exponent, Math.floor) }),
    ...(upperS === null ? {} : { upper: rounded(upperS, exponent, Math.ceil) }),
  });
}

function rounded(seconds: number, exponent: number, round: (value: number) => number): number {
  // Twelve digits first: 106 ns must not become 107 ns by the last bit of a sum.
  return Number(`${round(Number((seconds / 10 ** exponent).toPrecision(12)))}e${exponent}`);
}
