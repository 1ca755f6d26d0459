import { type Decimal } from "./decimal";
import { typedPrefix } from "./prefixes";
import { BLANK, matchAt, problemAt, skipBlanks, type Problem } from "./typed-text";
import { type Unit } from "./unit-list";

/** Above this a double no longer keeps every decimal digit (IEEE 754 binary64: 15 digits). */
const MOST_DIGITS = 15;
const LARGEST_POWER = 30;

const SIGN = /[+\-\u2212\u2013]/y;
const OVERLOAD = /(?:[O0]\.?L|overload|open|inf(?:inity)?)(?![A-Za-z0-9])|\u221e/iy;
const WHOLE = new RegExp(`\\d{1,3}(?:[${BLANK}]\\d{3})+(?!\\d)|\\d+`, "y");
const FRACTION = /\.(?!\.)(\d*)|,(\d+)/y;
const POWER = /[eE]([+\-\u2212]?)(\d+)/y;
const LETTER = /([RKkMGTmunpf\u00b5\u03bcVAFH\u03a9\u2126])(\d+)/y;
const LEADING_LETTER = /([RKkMmunp\u00b5\u03bc])(\d+)/y;
const SECOND_MARK = /[.,]\d/y;

/** A number as typed, before any unit that follows it. */
export type TypedNumber = {
  ok: true;
  overload: false | "any" | "open";
  negative: boolean;
  decimal: Decimal;
  /** Digits after the decimal mark, as typed. */
  decimals: number;
  /** The letter of a code such as 4k7 or 5V0 (IEC 60062), with the prefix or unit it stands for. */
  letter?: { typed: string; power: number; unit?: Unit };
  start: number;
  end: number;
};

/**
 * Reads a number at an index: sign, digits grouped by blanks, decimal point or comma, power of ten, or a letter in the
 * decimal mark's place (IEC 60062: 4k7, 0R5, R47, 5V0), or an overload (OL, ∞, open).
 * A comma is always the decimal mark: ISO 80000-1 groups digits by a small space, never by point or comma.
 */
export function readNumber(text: string, index: number): TypedNumber | Problem {
  const start = skipBlanks(text, index);
  const sign = matchAt(SIGN, text, start);
  const negative = sign !== undefined && sign[0] !== "+";
  const first = sign ? skipBlanks(text, start + 1) : start;

  const overload = matchAt(OVERLOAD, text, first);
  if (overload) {
    const kind = overload[0].toLowerCase() === "open" ? "open" : "any";
    const decimal = { coefficient: 0n, exponent: 0 };
    return { ok: true, overload: kind, negative, decimal, decimals: 0, start, end: first + overload[0].length };
  }

  const leading = matchAt(LEADING_LETTER, text, first);
  if (leading) return coded(text, { start, first, negative, whole: "0", letter: leading, at: first });

  const whole = matchAt(WHOLE, text, first)?.[0] ?? "";
  const afterWhole = first + whole.length;
  const letter = whole === "" ? undefined : matchAt(LETTER, text, afterWhole);
  if (letter) return coded(text, { start, first, negative, whole, letter, at: afterWhole });

  const mark = matchAt(FRACTION, text, afterWhole);
  const fraction = mark?.[1] ?? mark?.[2] ?? "";
  if (whole === "" && fraction === "") {
    return problemAt(
      first,
      first < text.length ? `a number belongs here, not “${text.charAt(first)}”.` : "a number is missing.",
    );
  }
  const afterFraction = afterWhole + (mark?.[0].length ?? 0);
  if (mark && matchAt(SECOND_MARK, text, afterFraction)) {
    return problemAt(afterFraction, "a second decimal mark. Write thousands with a blank or without anything.");
  }
  const power = matchAt(POWER, text, afterFraction);
  const exponent = power ? Number(`${power[1] === "" || power[1] === "+" ? "" : "-"}${power[2]}`) : 0;
  if (Math.abs(exponent) > LARGEST_POWER) {
    return problemAt(afterFraction, `powers of ten go from −${LARGEST_POWER} to ${LARGEST_POWER}.`);
  }
  const end = afterFraction + (power?.[0].length ?? 0);
  return assembled({ start, first, end, negative, whole, fraction, exponent });
}

type Coded = { start: number; first: number; negative: boolean; whole: string; letter: RegExpExecArray; at: number };

function coded(text: string, { letter, at, ...rest }: Coded): TypedNumber | Problem {
  const [all, typed = "", fraction = ""] = letter;
  const end = at + all.length;
  if (matchAt(SECOND_MARK, text, end)) return problemAt(end, `a second decimal mark: “${typed}” is one already.`);
  const number = assembled({ ...rest, end, fraction, exponent: 0 });
  return number.ok ? { ...number, letter: meaning(typed) } : number;
}

function meaning(typed: string): { typed: string; power: number; unit?: Unit } {
  const power = typedPrefix(typed);
  if (power !== undefined) return { typed, power };
  if (typed === "V" || typed === "A" || typed === "F" || typed === "H") return { typed, power: 0, unit: typed };
  return { typed, power: 0, unit: "Ω" };
}

type Parts = {
  start: number;
  first: number;
  end: number;
  negative: boolean;
  whole: string;
  fraction: string;
  exponent: number;
};

function assembled({ start, first, end, negative, whole, fraction, exponent }: Parts): TypedNumber | Problem {
  const digits = `${whole}${fraction}`.replace(/\D/g, "").replace(/^0+(?=\d)/, "");
  if (digits.length > MOST_DIGITS) return problemAt(first, `more than ${MOST_DIGITS} digits cannot be kept.`);
  const coefficient = BigInt(digits) * (negative ? -1n : 1n);
  const decimal = { coefficient, exponent: exponent - fraction.length };
  return { ok: true, overload: false, negative, decimal, decimals: fraction.length, start, end };
}
