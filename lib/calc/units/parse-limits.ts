import { lendUnits, settleLimit } from "./lend-units";
import { type Limits } from "./limits";
import { readLimits, type Side, type TypedLimits } from "./read-limits";
import { type TypedQuantity } from "./read-quantity";
import { withTolerance } from "./tolerance";
import { problemAt, unreadable, withPlainOuterBlanks, type Problem } from "./typed-text";
import { type Unit } from "./unit-list";

const LONGEST = 120;

export type ParsedLimits = { ok: true; value: Limits } | Problem;

/**
 * Reads limits as people write them: `5 V ± 5 %`, `5 V +10 % −5 %`, `(5 ± 0.25) V`, `3.6864 MHz ± 50 ppm`, `< 0.5 Ω`,
 * `≥ 200 Ω`, `0.5 Ω max`, `4.75 … 5.25 V`, `200 Ω to 2 kΩ`, `> 4.75 V, < 5.25 V`.
 *
 * `expected` as for parseQuantity. A unit on one side holds for the other; a prefix only on the second value holds for
 * a first value that has neither unit nor prefix (`1 … 2 kΩ`). `<` and `>` leave the bound out, everything else
 * includes it. A share is of the nominal value with its sign: −12 V +10 % −5 % is −13.2 … −11.4 V. Bounds are worked
 * out in decimal, so that 5 V ± 5 % ends at the double nearest to 5.25.
 *
 * Refused, with a sentence that names the column: lower above upper, a share of zero, a percentage of °C or dB (no
 * natural zero) or of % (points or parts?), an overload as a limit, a tolerance whose unit is in doubt (`10 kΩ ± 5`).
 */
export function parseLimits(text: string, expected?: Unit): ParsedLimits {
  const bad = unreadable(text, LONGEST);
  if (bad) return bad;
  const typed = readLimits(withoutParentheses(withPlainOuterBlanks(text)));
  if (!typed.ok) return typed;
  const unit = expected ?? unitTyped(typed);
  if (typed.kind === "tolerance") return withTolerance(typed, unit);
  if (typed.kind === "bounds") return bounded(typed.bounds, unit);
  const lower = { side: "lower" as const, inclusive: true, quantity: typed.first };
  return bounded([lower, { side: "upper", inclusive: true, quantity: typed.second }], unit);
}

/** "(5 ± 0.25) V" reads as "5 ± 0.25 V"; blanks in place of the parentheses keep the columns. */
function withoutParentheses(text: string): string {
  const found = /^( *)\(([^()]*)\)([^()]*)$/.exec(text);
  return found ? `${found[1]} ${found[2]} ${found[3]}` : text;
}

/** The unit that some value carries; metres when nothing but a lone m stands last, after a blank. */
function unitTyped(typed: TypedLimits): Unit | undefined {
  const quantities = quantitiesOf(typed);
  const said = quantities.find(({ unit }) => unit.unit !== undefined)?.unit.unit;
  const last = quantities.at(-1)?.unit;
  return said ?? (last?.loneM === true && last.gap ? "m" : undefined);
}

function quantitiesOf(typed: TypedLimits): TypedQuantity[] {
  if (typed.kind === "bounds") return typed.bounds.map(({ quantity }) => quantity);
  if (typed.kind === "range") return [typed.first, typed.second];
  const sides = [typed.minus, typed.plus].flatMap((side) => (side.of === "unit" ? [side.quantity] : []));
  return [typed.nominal, ...sides];
}

function bounded(bounds: (Side & { quantity: TypedQuantity })[], unit: Unit | undefined): ParsedLimits {
  const lent = lendUnits(bounds.map(({ quantity }) => quantity));
  if (!lent.ok) return lent;
  const limits: Limits = { unit: unit ?? "" };
  for (const [index, { side, inclusive, quantity }] of bounds.entries()) {
    const settled = settleLimit(lent.quantities[index] ?? quantity, unit);
    if (!settled.ok) return settled;
    limits.unit = settled.value.unit;
    limits[side] = settled.value.value;
    if (!inclusive) limits[side === "lower" ? "lowerInclusive" : "upperInclusive"] = false;
  }
  const lentPrefix = lent.quantities.some(
    ({ unit: { prefix } }, index) => prefix !== bounds[index]?.quantity.unit.prefix,
  );
  return inOrder(limits, bounds[0]?.quantity.start ?? 0, lentPrefix ? " Write the unit after both." : "");
}

function inOrder(limits: Limits, start: number, advice: string): ParsedLimits {
  const { lower, upper } = limits;
  if (lower === undefined || upper === undefined || lower < upper) return { ok: true, value: limits };
  const open = limits.lowerInclusive === false || limits.upperInclusive === false;
  if (lower === upper && !open) return { ok: true, value: limits };
  if (lower === upper)
    return problemAt(start, "both limits are the same value and leave it out, so no reading could fit.");
  return problemAt(start, `the lower limit lies above the upper one, so no reading could fit.${advice}`);
}
