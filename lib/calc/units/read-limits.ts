import { leftOver } from "./parse-quantity";
import { readNumber, type TypedNumber } from "./read-number";
import { readQuantity, type TypedQuantity } from "./read-quantity";
import { matchAt, problemAt, skipBlanks, type Problem } from "./typed-text";

const COMPARATOR = /<=|=<|>=|=>|[<>\u2264\u2265]|(?:at most|at least|below|above|under|over|max|min)\b\.?/iy;
const AFTERWARDS = /(?:max|min)\b\.?/iy;
const JOINT = /,(?!\d)|;|and\b/iy;
const PLUS_MINUS = /\u00b1|\+\s*\/?\s*[-\u2212\u2013]/y;
const RANGE = /\u2026|\.{2,3}|to\b|[-\u2212\u2013]/iy;
const SIGN = /[+\-\u2212\u2013]/y;
const DASH = /[-\u2212\u2013]/y;
const SHARE = /%|percent\b|ppm\b/iy;

/** Which side a comparator bounds, and whether the bound itself is allowed. */
export type Side = { side: "lower" | "upper"; inclusive: boolean };

/** One side of a tolerance as typed: a share of the nominal value, or a quantity. */
export type TypedDeviation =
  | { ok: true; of: "percent" | "ppm"; number: TypedNumber; start: number; end: number }
  | { ok: true; of: "unit"; quantity: TypedQuantity; start: number; end: number };

/** Limits as typed, before units are settled. */
export type TypedLimits =
  | { ok: true; kind: "bounds"; bounds: (Side & { quantity: TypedQuantity })[] }
  | { ok: true; kind: "range"; first: TypedQuantity; second: TypedQuantity }
  | { ok: true; kind: "tolerance"; nominal: TypedQuantity; minus: TypedDeviation; plus: TypedDeviation };

/** Reads the form of the limits: comparators, a range, or a nominal value with its tolerance. */
export function readLimits(text: string): TypedLimits | Problem {
  const start = skipBlanks(text, 0);
  if (matchAt(COMPARATOR, text, start)) return readBounds(text, start);
  const first = readQuantity(text, start);
  if (!first.ok) return first;
  const after = skipBlanks(text, first.end);

  const word = matchAt(AFTERWARDS, text, after);
  if (word) {
    const bound = { ...sideOf(word[0]), quantity: first };
    return leftOver(text, after + word[0].length) ?? { ok: true, kind: "bounds", bounds: [bound] };
  }
  const plusMinus = matchAt(PLUS_MINUS, text, after);
  if (plusMinus) return readSymmetric(text, first, after + plusMinus[0].length);
  const twoSided = matchAt(SIGN, text, after) && readTwoSided(text, first, after);
  if (twoSided) return twoSided;
  const range = matchAt(RANGE, text, after);
  if (range) return readRange(text, first, after + range[0].length);
  return (
    leftOver(text, first.end) ??
    problemAt(after, "one value alone is no limit. Write ± with a tolerance, a second value, or < or > before it.")
  );
}

function sideOf(comparator: string): Side {
  const word = comparator.toLowerCase().replace(".", "");
  const upper = /^(<|=<|≤|at most|below|under|max)/.test(word);
  return { side: upper ? "upper" : "lower", inclusive: !/^([<>]|below|above|under|over)$/.test(word) };
}

function readBounds(text: string, start: number): TypedLimits | Problem {
  const bounds: (Side & { quantity: TypedQuantity })[] = [];
  let at = start;
  for (;;) {
    const comparator = matchAt(COMPARATOR, text, at);
    if (!comparator) return problemAt(at, "the second limit needs its own < or >.");
    const side = sideOf(comparator[0]);
    if (bounds.some((bound) => bound.side === side.side)) {
      return problemAt(at, `there is a${side.side === "upper" ? "n upper" : " lower"} limit already.`);
    }
    const quantity = readQuantity(text, at + comparator[0].length);
    if (!quantity.ok) return quantity;
    bounds.push({ ...side, quantity });
    const next = skipBlanks(text, quantity.end);
    const joint = matchAt(JOINT, text, next);
    if (!joint) return leftOver(text, quantity.end) ?? { ok: true, kind: "bounds", bounds };
    at = skipBlanks(text, next + joint[0].length);
  }
}

function readRange(text: string, first: TypedQuantity, at: number): TypedLimits | Problem {
  const second = readQuantity(text, at);
  if (!second.ok) return second;
  return leftOver(text, second.end) ?? { ok: true, kind: "range", first, second };
}

function readSymmetric(text: string, nominal: TypedQuantity, at: number): TypedLimits | Problem {
  const start = skipBlanks(text, at);
  if (matchAt(SIGN, text, start)) return problemAt(start, "a tolerance after ± has no sign of its own.");
  const both = readDeviation(text, start);
  if (!both.ok) return both;
  return leftOver(text, both.end) ?? { ok: true, kind: "tolerance", nominal, minus: both, plus: both };
}

/** "+10 % −5 %", "−5 % +10 %", "+10/−5 %". Undefined when it is rather a range ("4.75 - 5.25 V"). */
function readTwoSided(text: string, nominal: TypedQuantity, at: number): TypedLimits | Problem | undefined {
  const first = readDeviation(text, at);
  const minusFirst = matchAt(DASH, text, at) !== undefined;
  if (!first.ok) return minusFirst ? undefined : first;
  const gap = skipBlanks(text, first.end);
  const next = text.charAt(gap) === "/" ? skipBlanks(text, gap + 1) : gap;
  const opposite = minusFirst ? text.charAt(next) === "+" : matchAt(DASH, text, next) !== undefined;
  if (!opposite && minusFirst && (first.of === "unit" || inPercent(nominal))) return undefined;
  if (!opposite)
    return problemAt(next, "a tolerance needs both sides, as in +10 % −5 %; write 0 for the side that has none.");
  const second = readDeviation(text, next);
  if (!second.ok) return second;
  const shared = borrowed(first, second);
  const sides = minusFirst ? { minus: shared, plus: second } : { minus: second, plus: shared };
  return leftOver(text, second.end) ?? { ok: true, kind: "tolerance", nominal, ...sides };
}

/** "40 - 60 %", "40 % - 60 %": a range of percent, not a tolerance. */
const inPercent = (nominal: TypedQuantity) => nominal.unit.unit === "%" || !hasUnit(nominal);

/** In "+10/−5 %" and "+0.5/−0.25 V" the first side takes what stands after the second. */
function borrowed(first: TypedDeviation, second: TypedDeviation): TypedDeviation {
  if (first.of !== "unit" || hasUnit(first.quantity)) return first;
  const { start, end } = first;
  if (second.of !== "unit") return { ok: true, of: second.of, number: first.quantity.number, start, end };
  return { ...first, quantity: { ...first.quantity, unit: second.quantity.unit } };
}

/** True when a prefix or a unit was typed. */
export const hasUnit = ({ unit }: TypedQuantity): boolean => unit.unit !== undefined || unit.prefix !== undefined;

function readDeviation(text: string, at: number): TypedDeviation | Problem {
  const number = readNumber(text, at);
  if (!number.ok) return number;
  const afterNumber = skipBlanks(text, number.end);
  const share = matchAt(SHARE, text, afterNumber);
  if (share && number.letter === undefined && number.overload === false) {
    const of = share[0].toLowerCase() === "ppm" ? "ppm" : "percent";
    return { ok: true, of, number, start: number.start, end: afterNumber + share[0].length };
  }
  const quantity = readQuantity(text, at);
  return quantity.ok ? { ok: true, of: "unit", quantity, start: quantity.start, end: quantity.end } : quantity;
}
