import { shortQuantity } from "../units";
import { type MachineRail, type PoweredPlacement, type SupplyMargin } from "./machine-budget";

/** Less than this left is scant: supplies age and budgets forget things. Common practice, no source. */
const SCANT_PERCENT = 20;

/** What all placements take from a rail against what its supply gives; (capacity − worst) / capacity is left. */
export function supplyMargin(
  { name, volts, capacityA }: MachineRail,
  placements: readonly PoweredPlacement[],
): SupplyMargin {
  const draws = placements.flatMap((placement) => placement.draws).filter((draw) => draw.rail === name);
  const sum = {
    typical: draws.reduce((total, draw) => total + draw.typicalA, 0),
    worst: draws.reduce((total, draw) => total + draw.worstA, 0),
  };
  // Twelve digits, so that 4 of 5 A leave 20 % and not a hair less.
  const leftPercent = capacityA === null ? null : Number((((capacityA - sum.worst) / capacityA) * 100).toPrecision(12));
  const verdict =
    leftPercent === null
      ? "unknown"
      : leftPercent < 0
        ? "too little"
        : leftPercent < SCANT_PERCENT
          ? "scant"
          : "enough";
  const taken = `${name}: ${shortQuantity(sum.worst, "A")} at worst`;
  const sentence =
    capacityA === null || leftPercent === null
      ? `${taken}; what its supply gives is not known.`
      : leftPercent < 0
        ? `${taken}, ${shortQuantity(sum.worst - capacityA, "A")} more than the ${shortQuantity(capacityA, "A")} of its supply.`
        : `${taken} of ${shortQuantity(capacityA, "A")}, ${Math.floor(leftPercent)}\u202f% left.`;
  return { rail: name, volts, sum, capacityA, leftPercent, verdict, sentence };
}
