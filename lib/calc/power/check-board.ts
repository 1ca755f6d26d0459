import { fault, needsNotNegative, type Fault } from "../computed";
import { checkItem } from "./check-items";
import { type BoardPowerInput, type PowerItem, type RailSupply, type TypedDraw } from "./item";

/** All rails of the board by name, those that its regulators make among them. */
export type Rails = Map<string, RailSupply>;

/** The first row that cannot be used. */
export function checkBoard(
  { items, rails: given, typed, elsewhere }: BoardPowerInput,
  rails: Rails,
): Fault | undefined {
  return (
    first(given, (rail, index) => checkRail(rail, `rails/${index}`)) ??
    first(items, (item, index) => {
      const row = `items/${index}`;
      return checkItem(item, row) ?? needsRail(rails, item.rail, item.label, row) ?? needsHeadroom(item, rails, row);
    }) ??
    first(typed, (draw, index) => checkDraw(draw, rails, "The figure typed in", `typed/${index}`)) ??
    first(elsewhere, (draw, index) => checkDraw(draw, rails, "What other boards take", `elsewhere/${index}`))
  );
}

function first<T>(list: readonly T[], check: (one: T, index: number) => Fault | undefined): Fault | undefined {
  for (const [index, one] of list.entries()) {
    const bad = check(one, index);
    if (bad) return bad;
  }
  return undefined;
}

function checkRail({ name, volts, tolerancePercent }: RailSupply, row: string): Fault | undefined {
  if (!Number.isFinite(volts) || volts === 0) return fault(row, `${name} has no voltage.`);
  if (tolerancePercent >= 100) return fault(row, `${name}: a tolerance of ${tolerancePercent} % leaves no voltage.`);
  return needsNotNegative(row, `tolerance of ${name}`, tolerancePercent);
}

const needsRail = (rails: Rails, rail: string, label: string, row: string): Fault | undefined =>
  rails.has(rail) ? undefined : fault(row, `${label}: there is no rail ${rail} in this machine.`);

function needsHeadroom(item: PowerItem, rails: Rails, row: string): Fault | undefined {
  if (item.kind !== "regulator" || item.type.kind === "switching") return undefined;
  const volts = Math.abs(rails.get(item.rail)?.volts ?? 0);
  if (volts > item.outputVolts) return undefined;
  return fault(row, `${item.label} is linear: it cannot make ${item.outputVolts} V from ${volts} V.`);
}

function checkDraw({ rail, typicalA, worstA }: TypedDraw, rails: Rails, what: string, row: string): Fault | undefined {
  const bad =
    needsNotNegative(row, `typical current from ${rail}`, typicalA) ??
    needsNotNegative(row, `worst current from ${rail}`, worstA);
  if (bad) return bad;
  if (typicalA > worstA) return fault(row, `${what} from ${rail}: the typical current is above the worst.`);
  return needsRail(rails, rail, what, row);
}
