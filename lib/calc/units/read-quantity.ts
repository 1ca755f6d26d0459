import { shifted, toNumber, type Decimal } from "./decimal";
import { readNumber, type TypedNumber } from "./read-number";
import { readUnit, settleUnit, type TypedUnit } from "./read-unit";
import { problemAt, type Problem } from "./typed-text";
import { unitEntry, type Quantity, type Unit } from "./unit-list";

/** The largest and smallest magnitude that is kept; nothing on a bench lies beyond. */
const LARGEST = 1e30;
const SMALLEST = 1e-30;

/** A number with its unit as typed, before it is known what unit the place expects. */
export type TypedQuantity = { ok: true; number: TypedNumber; unit: TypedUnit; start: number; end: number };

/** Reads a number and any unit at an index; "4k7 ohm" and "5V0" have part of the unit inside the number. */
export function readQuantity(text: string, index: number): TypedQuantity | Problem {
  const number = readNumber(text, index);
  if (!number.ok) return number;
  const after = readUnit(text, number.end);
  if (!after.ok) return after;
  const unit = joined(number, after);
  return unit.ok ? { ok: true, number, unit, start: number.start, end: after.end } : unit;
}

function joined({ letter, start }: TypedNumber, after: TypedUnit): TypedUnit | Problem {
  if (letter === undefined) return after;
  if (after.prefix !== undefined) {
    return problemAt(after.start, `a prefix too many: “${letter.typed}” inside the number is one already.`);
  }
  if (letter.unit === undefined) return { ...after, prefix: letter.typed, power: letter.power };
  if (after.unit !== undefined && after.unit !== letter.unit) {
    return problemAt(after.start, `“${letter.typed}” inside the number says ${unitEntry(letter.unit).name} already.`);
  }
  return { ...after, unit: letter.unit, start: after.unit === undefined ? start : after.start };
}

/** A typed quantity settled on its unit: exact value and value of one count of its last digit, both in the base unit. */
export type SettledQuantity = {
  ok: true;
  exact: Decimal;
  value: Quantity;
  digits: { decimals: number; resolution: number };
};

/** Settles a typed quantity on the expected unit. Refuses what does not fit it. */
export function settleQuantity(typed: TypedQuantity, expected: Unit | undefined): SettledQuantity | Problem {
  const { number, start } = typed;
  const settled = settleUnit(typed.unit, expected);
  if (!settled.ok) return settled;
  const { unit, power } = settled;
  if (number.overload) return overload(typed, unit, expected);
  const exact = shifted(number.decimal, power);
  const value = toNumber(exact);
  if (Math.abs(value) > LARGEST) return problemAt(start, "the value is larger than anything on a bench.");
  if (value !== 0 && Math.abs(value) < SMALLEST)
    return problemAt(start, "the value is smaller than anything on a bench.");
  const resolution = Number(`1e${exact.exponent}`);
  return { ok: true, exact, value: { value, unit }, digits: { decimals: number.decimals, resolution } };
}

function overload({ number, unit: typed, start }: TypedQuantity, unit: Unit, expected: Unit | undefined) {
  const unsaid = typed.unit === undefined && expected === undefined;
  const fits = number.overload === "open" ? unit === "Ω" && !number.negative : unitEntry(unit).overload;
  if (!fits && !unsaid) return problemAt(start, `an overload makes no sense for ${unitEntry(unit).name}.`);
  const exact = { coefficient: 0n, exponent: 0 };
  const value = { value: number.negative ? -Infinity : Infinity, unit };
  return { ok: true as const, exact, value, digits: { decimals: 0, resolution: 0 } };
}
