import { type LogicPart } from "../logic-parts";
import { type GateTotals, type Owner } from "./expand";

/** Σ ⌈gates of a function / gates per package⌉: no packing of these gates into these parts has fewer packages. */
export function fewestPackages(totals: GateTotals, packages: Record<string, LogicPart>): number {
  let sum = 0;
  for (const [gateFunction, count] of totals) {
    const perPackage = packages[gateFunction]?.gatesPerPackage;
    if (perPackage) sum += Math.ceil(count / perPackage);
  }
  return sum;
}

/** Packages when each instance of a block, and the loose gates, have their own. */
export const perBlockPackages = (owners: readonly Owner[], packages: Record<string, LogicPart>): number =>
  owners.reduce((sum, owner) => sum + fewestPackages(owner.gates, packages), 0);
