import { type Deviation, type Limits } from "./limits";
import { type Unit } from "./unit-list";
import {
  decimalsNeeded,
  engineeringPower,
  fixed,
  leadingPower,
  needsPowerOfTen,
  nextPower,
  scaled,
  unitText,
  withPowerOfTen,
} from "./write-number";

const MOST_DIGITS = 15;

/**
 * Writes limits as parseLimits reads them: `4.75 … 5.25 V`, `< 0.5 Ω`, `200 Ω … 2 kΩ`, `5 V ± 5 %`, `5 V +10 % −5 %`.
 * A tolerance is written as a tolerance when it was typed as one; bounds that are left out keep their `<` and `>`.
 * Up to 15 digits, none invented: parseLimits(formatLimits(x), x.unit) gives x again. Without any bound: `no limits`.
 */
export function formatLimits(limits: Limits): string {
  const { unit, nominal, tolerance, lower, upper } = limits;
  if (nominal !== undefined && tolerance !== undefined) return withTolerance(nominal, tolerance, unit);
  if (lower !== undefined && upper !== undefined) {
    if (limits.lowerInclusive !== false && limits.upperInclusive !== false) return range(lower, upper, unit);
    return `${lowerOnly(lower, limits)}, ${upperOnly(upper, limits)}`;
  }
  if (lower !== undefined) return lowerOnly(lower, limits);
  return upper !== undefined ? upperOnly(upper, limits) : "no limits";
}

const lowerOnly = (lower: number, { unit, lowerInclusive }: Limits) =>
  `${lowerInclusive === false ? ">" : "≥"} ${alone(lower, unit)}`;

const upperOnly = (upper: number, { unit, upperInclusive }: Limits) =>
  `${upperInclusive === false ? "<" : "≤"} ${alone(upper, unit)}`;

function range(lower: number, upper: number, unit: Unit): string {
  const larger = Math.abs(lower) > Math.abs(upper) ? lower : upper;
  const power = shortestPower(larger, unit);
  if (!withinTen(lower, upper) || needsPowerOfTen(lower, power) || needsPowerOfTen(upper, power)) {
    return `${alone(lower, unit)} … ${alone(upper, unit)}`;
  }
  const decimals = Math.max(decimalsOf(lower, power), decimalsOf(upper, power));
  return `${fixed(scaled(lower, power), decimals)} … ${fixed(scaled(upper, power), decimals)}${unitText(unit, power)}`;
}

/** Values within a factor of ten share a prefix; zero goes with any. */
function withinTen(a: number, b: number): boolean {
  const [small = 0, large = 0] = [Math.abs(a), Math.abs(b)].sort((one, other) => one - other);
  return small === 0 || large < 10 * small;
}

function withTolerance(nominal: number, { minus, plus }: { minus: Deviation; plus: Deviation }, unit: Unit): string {
  const value = alone(nominal, unit);
  const power = shortestPower(nominal, unit);
  const up = deviation(plus, unit, power);
  const down = deviation(minus, unit, power);
  return up === down ? `${value} ± ${up}` : `${value} +${up} −${down}`;
}

/** An amount takes the nominal value's prefix while two decimals are enough. */
function deviation({ amount, of }: Deviation, unit: Unit, power: number): string {
  if (of === "percent") return `${number(amount, 0)}${unitText("%", 0)}`;
  if (of === "ppm") return `${number(amount, 0)}\u202fppm`;
  const same = decimalsOf(amount, power) <= 2 && !needsPowerOfTen(amount, power);
  return same ? `${number(amount, power)}${unitText(unit, power)}` : alone(amount, unit);
}

/** One value with its unit, in the prefix that is shortest to read: 0.5 Ω, not 500 mΩ. */
function alone(value: number, unit: Unit): string {
  const power = shortestPower(value, unit);
  if (needsPowerOfTen(value, power)) return `${withPowerOfTen(value)}${unitText(unit, 0)}`;
  return `${number(value, power)}${unitText(unit, power)}`;
}

function shortestPower(value: number, unit: Unit): number {
  const engineering = engineeringPower(value, unit);
  const larger = nextPower(engineering, unit);
  if (larger === undefined || needsPowerOfTen(value, larger)) return engineering;
  const length = (power: number) => `${number(value, power)}${unitText(unit, power)}`.length;
  return length(larger) < length(engineering) ? larger : engineering;
}

const decimalsOf = (value: number, power: number): number =>
  Math.min(decimalsNeeded(value, power), Math.max(0, MOST_DIGITS - 1 - (leadingPower(value) - power)));

function number(value: number, power: number): string {
  const decimals = decimalsOf(value, power);
  const text = fixed(scaled(value, power), decimals);
  return needsPowerOfTen(value, power) ? withPowerOfTen(scaled(value, power)) : text;
}
