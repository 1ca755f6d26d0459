import { type Quantity } from "./unit-list";
import {
  engineeringPower,
  fixed,
  leadingPower,
  needsPowerOfTen,
  nextPower,
  scaled,
  unitText,
  withPowerOfTen,
} from "./write-number";

const DEFAULT_SIGNIFICANT = 6;
const MOST_SIGNIFICANT = 17;

/** How many digits to write; the first that is given counts. */
export type Digits = {
  /** Value of one count of the last digit, in the base unit: what the instrument resolved. */
  resolution?: number;
  /** Significant digits, 1 to 17. */
  significant?: number;
  /** Digits after the decimal mark. */
  digits?: number;
};

/**
 * Writes a quantity with an engineering prefix and a thin space: `4.98 V`, `1.24 kΩ`, `120 mA`, `−12 V`.
 *
 * Without options at most six significant digits, digits before the mark never rounded away, zeros at the end dropped.
 * With `resolution` the digits end where the instrument's did, and the prefix is raised rather than writing a zero that
 * was never read (0.50 V is not written 500 mV). A plain number takes no prefix; °C, % and dB take none either.
 * An overload is written `OL`, and no number at all `—`.
 *
 * Sources: ISO 80000-1:2009 §7.1 and the SI Brochure, 9th edition, §5.4 (space, minus sign, prefixes), from memory.
 */
export function formatQuantity({ value, unit }: Quantity, options: Digits = {}): string {
  if (Number.isNaN(value)) return "—";
  if (!Number.isFinite(value)) return `${value < 0 ? "−" : ""}OL${unitText(unit, 0)}`;
  const significant = wholeBetween(options.significant, 1, MOST_SIGNIFICANT);
  const resolution = options.resolution !== undefined && options.resolution > 0 ? options.resolution : undefined;
  const power = startingPower({ value, unit }, resolution);
  if (resolution === undefined && options.digits === undefined && needsPowerOfTen(value, power)) {
    return `${withPowerOfTen(value, significant ?? DEFAULT_SIGNIFICANT)}${unitText(unit, 0)}`;
  }
  const written = (at: number) => numberAt(value, at, { ...options, resolution, significant });
  const number = written(power);
  const larger = nextPower(power, unit);
  const rolledOver = larger !== undefined && /^−?1000(\D|$)/.test(number) && Math.abs(scaled(value, power)) < 1000;
  return rolledOver ? `${written(larger)}${unitText(unit, larger)}` : `${number}${unitText(unit, power)}`;
}

function startingPower({ value, unit }: Quantity, resolution: number | undefined): number {
  const reach = resolution === undefined ? undefined : leadingPower(resolution);
  if (value === 0) return reach === undefined ? 0 : engineeringPower(Number(`1e${reach + 3}`), unit);
  let power = engineeringPower(value, unit);
  while (reach !== undefined && reach > power) {
    const larger = nextPower(power, unit);
    if (larger === undefined) break;
    power = larger;
  }
  return power;
}

function numberAt(value: number, power: number, { resolution, significant, digits }: Digits): string {
  const number = scaled(value, power);
  if (resolution !== undefined) return fixed(number, power - leadingPower(resolution));
  if (significant !== undefined) {
    const rounded = Number(number.toPrecision(significant));
    return fixed(rounded, significant - 1 - leadingPower(rounded));
  }
  if (digits !== undefined) return fixed(number, wholeBetween(digits, 0, 15) ?? 0);
  const text = fixed(number, DEFAULT_SIGNIFICANT - 1 - leadingPower(number));
  return text.includes(".") ? text.replace(/\.?0+$/, "") : text;
}

function wholeBetween(value: number | undefined, least: number, most: number): number | undefined {
  if (value === undefined || Number.isNaN(value)) return undefined;
  return Math.min(Math.max(Math.round(value), least), most);
}
