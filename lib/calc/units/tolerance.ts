import { magnitude, negated, product, shifted, sum, toNumber, type Decimal } from "./decimal";
import { lendUnits, settleLimit } from "./lend-units";
import { type Deviation, type Limits } from "./limits";
import { hasUnit, type TypedDeviation, type TypedLimits } from "./read-limits";
import { type TypedQuantity } from "./read-quantity";
import { problemAt, type Problem } from "./typed-text";
import { unitEntry, type Unit } from "./unit-list";

const LARGEST = 1e30;
/** Powers of ten of one percent and one part per million. */
const SHARE = { percent: -2, ppm: -6 } as const;

type Tolerance = Extract<TypedLimits, { kind: "tolerance" }>;
type Amount = { ok: true; deviation: Deviation; change: Decimal };

/** A nominal value with its tolerance, worked out in decimal. */
export function withTolerance(typed: Tolerance, expected: Unit | undefined): { ok: true; value: Limits } | Problem {
  const nominal = settleLimit(nominalWithUnit(typed), expected);
  if (!nominal.ok) return nominal;
  const { unit, value } = nominal.value;
  const amountOf = (side: TypedDeviation) =>
    amount(side, { typed: typed.nominal, exact: nominal.exact, unit }, expected);
  const minus = amountOf(typed.minus);
  if (!minus.ok) return minus;
  const plus = amountOf(typed.plus);
  if (!plus.ok) return plus;

  const ends = [sum(nominal.exact, negated(minus.change)), sum(nominal.exact, plus.change)].map(toNumber);
  const [lower, upper] = [Math.min(...ends), Math.max(...ends)];
  if (Math.max(-lower, upper) > LARGEST)
    return problemAt(typed.plus.start, "the tolerance is larger than anything on a bench.");
  const tolerance = { minus: minus.deviation, plus: plus.deviation };
  return { ok: true, value: { unit, lower, upper, nominal: value, tolerance } };
}

/** "5 ± 0.25 V", "3.3 ± 0.1 kΩ": the unit after the tolerance holds for the nominal value too. */
function nominalWithUnit({ nominal, plus, minus }: Tolerance): TypedQuantity {
  const lender = [plus, minus].flatMap((side) =>
    side.of === "unit" && hasUnit(side.quantity) ? [side.quantity] : [],
  )[0];
  const lent = lender && lendUnits([nominal, lender]);
  return (lent?.ok ? lent.quantities[0] : undefined) ?? nominal;
}

type Nominal = { typed: TypedQuantity; exact: Decimal; unit: Unit };

/** The change that one side allows; a share changes the nominal value with its sign. */
function amount(side: TypedDeviation, nominal: Nominal, expected: Unit | undefined): Amount | Problem {
  if (side.of !== "unit") return share(side, nominal);
  const zero = side.quantity.number.decimal.coefficient === 0n;
  if (!hasUnit(side.quantity) && hasUnit(nominal.typed) && !zero) {
    return problemAt(side.start, "the tolerance needs % or a unit after it.");
  }
  const settled = settleLimit(side.quantity, expected ?? nominal.unit);
  if (!settled.ok) return settled;
  const change = magnitude(settled.exact);
  return { ok: true, deviation: { amount: toNumber(change), of: "unit" }, change };
}

function share(side: Exclude<TypedDeviation, { of: "unit" }>, { exact, unit }: Nominal): Amount | Problem {
  if (exact.coefficient === 0n)
    return problemAt(side.start, "a percentage of zero is zero. Give the tolerance in the unit.");
  const { relative, name } = unitEntry(unit);
  if (!relative)
    return problemAt(side.start, `a percentage of ${name} may mean two things. Write both limits instead.`);
  const part = magnitude(side.number.decimal);
  const change = product(exact, shifted(part, SHARE[side.of]));
  return { ok: true, deviation: { amount: toNumber(part), of: side.of }, change };
}
