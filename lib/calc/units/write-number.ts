import { prefixSymbol } from "./prefixes";
import { unitEntry, type Unit } from "./unit-list";

/** Between a number and its unit: a thin space at which no line ends (NARROW NO-BREAK SPACE). */
export const THIN = "\u202f";
const MINUS = "\u2212";

/** Digits and power of ten of the leading digit, from the shortest decimal that names the double. */
function digitsOf(value: number): { digits: string; exponent: number } {
  const [digits = "0", exponent = "0"] = Math.abs(value).toExponential().split("e");
  return { digits, exponent: Number(exponent) };
}

/** Power of ten of the leading digit; 0 for zero. */
export const leadingPower = (value: number): number => digitsOf(value).exponent;

/** value / 10^power, shifted in decimal so that no rounding creeps in. */
export function scaled(value: number, power: number): number {
  const { digits, exponent } = digitsOf(value);
  return (value < 0 ? -1 : 1) * Number(`${digits}e${exponent - power}`);
}

/** Digits after the mark that the shortest decimal of value / 10^power needs. */
export function decimalsNeeded(value: number, power: number): number {
  const { digits, exponent } = digitsOf(value);
  return Math.max(0, digits.replace(".", "").length - 1 - (exponent - power));
}

/** The largest prefix of the unit not above the leading digit; its smallest one when there is none. */
export function engineeringPower(value: number, unit: Unit): number {
  const powers = unit === "" ? [0] : unitEntry(unit).prefixes;
  const leading = leadingPower(value);
  if (value === 0) return 0;
  return powers.filter((power) => power <= leading).at(-1) ?? powers[0] ?? 0;
}

/** The next larger prefix of the unit. */
export function nextPower(power: number, unit: Unit): number | undefined {
  return unit === "" ? undefined : unitEntry(unit).prefixes.find((other) => other > power);
}

/** True when the number would be a row of zeros even with the best prefix; then it is written with a power of ten. */
export function needsPowerOfTen(value: number, power: number): boolean {
  const leading = leadingPower(value) - power;
  return value !== 0 && (leading > (power > 0 ? 5 : 14) || leading < -6);
}

/** A fixed number of decimals, with the minus sign of typography and never −0. */
export function fixed(value: number, decimals: number): string {
  const text = Math.abs(value).toFixed(Math.min(Math.max(decimals, 0), 100));
  return value < 0 && /[1-9]/.test(text) ? `${MINUS}${text}` : text;
}

/** As `4.7e20`, in the base unit. */
export function withPowerOfTen(value: number, significant?: number): string {
  const text = significant === undefined ? value.toExponential() : value.toExponential(significant - 1);
  return text
    .replace(/\.?0+e/, "e")
    .replace("e+", "e")
    .replaceAll("-", MINUS);
}

/** The prefixed unit after its thin space; nothing for a plain number. */
export function unitText(unit: Unit, power: number): string {
  const symbol = `${prefixSymbol(power)}${unit}`;
  return symbol === "" ? "" : `${THIN}${symbol}`;
}
