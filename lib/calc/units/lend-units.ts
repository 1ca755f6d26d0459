import { hasUnit } from "./read-limits";
import { settleQuantity, type SettledQuantity, type TypedQuantity } from "./read-quantity";
import { problemAt, type Problem } from "./typed-text";
import { type Unit } from "./unit-list";

/**
 * Lends the unit and prefix of the last value to those before it that have neither: "1 … 2 kΩ" is 1 kΩ … 2 kΩ.
 * A last value with neither takes a plain unit from before it ("5 V … 6"), but not a prefix ("1 kΩ … 2" is in doubt).
 */
export function lendUnits(quantities: TypedQuantity[]): { ok: true; quantities: TypedQuantity[] } | Problem {
  const last = quantities.at(-1);
  if (last === undefined || hasUnit(last)) {
    const lent = quantities.map((one) => (last === undefined || hasUnit(one) ? one : { ...one, unit: last.unit }));
    return { ok: true, quantities: lent };
  }
  if (quantities.some(({ unit }) => unit.prefix !== undefined)) {
    return problemAt(last.start, "write the unit after this value as well; the one before it has a prefix.");
  }
  return { ok: true, quantities };
}

/** Settles a value that has to be a number: an overload is no limit. */
export function settleLimit(quantity: TypedQuantity, unit: Unit | undefined): SettledQuantity | Problem {
  const settled = settleQuantity(quantity, unit);
  if (settled.ok && !Number.isFinite(settled.value.value)) {
    return problemAt(quantity.start, "a limit needs a number; leave out the side that has none.");
  }
  return settled;
}
