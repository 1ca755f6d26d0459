import { readQuantity, settleQuantity } from "./read-quantity";
import { problemAt, skipBlanks, unreadable, withPlainOuterBlanks, type Problem } from "./typed-text";
import { type Quantity, type Unit } from "./unit-list";

const LONGEST = 40;

export type ParsedQuantity =
  | {
      ok: true;
      value: Quantity;
      /** Digits after the decimal mark as typed, and the value of one count of the last of them in the base unit. */
      digits: { decimals: number; resolution: number };
    }
  | Problem;

/**
 * Reads a quantity as people write it: `4k7`, `100n`, `2.2 µF`, `5V0`, `0R5`, `4,98 V`, `−12 V`, `1e-3`, `1 000`, `OL`.
 *
 * `expected` is the unit of the place: taken when none is typed, refused when another one is. Without it, a number
 * without a unit is a plain number. The value is the double nearest to what was typed, in the base unit; an overload is
 * ±Infinity with a resolution of 0. Never NaN, never −0.
 *
 * A comma is always the decimal mark (`4,983 V` is just under five volts; `1,000` is one), as digits are grouped by
 * blanks only. M is mega and m is milli; where capitals were typed carelessly enough to leave a doubt (`mhz`, `MOHM`),
 * and for `5m` without a unit, the text is refused. A prefix that nobody means (`20 MA`) is refused too.
 *
 * Errors are values: a sentence that names the column, counted from 1. At most 40 characters, 15 digits, 10^±30.
 *
 * Sources: ISO 80000-1:2009 §7 (signs, spacing, digit groups) and IEC 60062 (letter as decimal mark), both from memory.
 */
export function parseQuantity(text: string, expected?: Unit): ParsedQuantity {
  const bad = unreadable(text, LONGEST);
  if (bad) return bad;
  const plain = withPlainOuterBlanks(text);
  const typed = readQuantity(plain, 0);
  if (!typed.ok) return typed;
  const rest = leftOver(plain, typed.end);
  if (rest) return rest;
  const settled = settleQuantity(typed, expected);
  return settled.ok ? { ok: true, value: settled.value, digits: settled.digits } : settled;
}

/** Refuses whatever still stands at an index. */
export function leftOver(text: string, index: number): Problem | undefined {
  const at = skipBlanks(text, index);
  if (at >= text.length) return undefined;
  if (/\d/.test(text.charAt(at)) && /\d/.test(text.charAt(index - 1))) {
    return problemAt(at, "a blank inside a number may only part groups of three digits.");
  }
  return problemAt(at, `“${text.slice(at).trim()}” was not understood.`);
}
