import type { DelayWindow } from "@/lib/calc/delay";
import { formatLimits } from "@/lib/calc/units";

const DIGITS = 3;

/** The window as limits of a check, rounded outwards: a figure to three digits must not shut out what was worked out. */
export function windowLimits({ lowerS, upperS }: DelayWindow): string | undefined {
  if (lowerS === null && upperS === null) return undefined;
  return formatLimits({
    unit: "s",
    ...(lowerS === null ? {} : { lower: outwards(lowerS, Math.floor) }),
    ...(upperS === null ? {} : { upper: outwards(upperS, Math.ceil) }),
  });
}

function outwards(seconds: number, round: (value: number) => number): number {
  if (seconds === 0) return 0;
  const exponent = Math.floor(Math.log10(seconds)) - DIGITS + 1;
  // Twelve digits first: 106 ns must not become 107 ns by the last bit of a sum.
  const scaled = Number((seconds / 10 ** exponent).toPrecision(12));
  return Number(`${round(scaled)}e${exponent}`);
}
