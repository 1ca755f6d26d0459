import { partLabel, type LogicPart } from "../logic-parts";
import { type Owner } from "./expand";
import { type PackedGate, type PlacedPackage } from "./packing";

export type Placed = PlacedPackage & { logic: LogicPart; forBlock: string | null };

/** Fills packages gate by gate in the order of the owners, so that the gates of one owner stay together. */
export function placeGates(
  pools: readonly { forBlock: string | null; owners: readonly Owner[] }[],
  packages: Record<string, LogicPart>,
  family: string,
): Placed[] {
  const placed: Placed[] = [];
  for (const { forBlock, owners } of pools) {
    for (const gateFunction of new Set(owners.flatMap((owner) => [...owner.gates.keys()]))) {
      const logic = packages[gateFunction];
      if (!logic) continue;
      const labels = owners.flatMap((owner) =>
        Array.from({ length: owner.gates.get(gateFunction) ?? 0 }, () => owner.label),
      );
      for (let at = 0; at < labels.length; at += logic.gatesPerPackage) {
        placed.push({
          designator: `U${placed.length + 1}`,
          part: partLabel(logic, family),
          gateFunction,
          gates: gatesOf(logic, labels.slice(at, at + logic.gatesPerPackage)),
          logic,
          forBlock,
        });
      }
    }
  }
  return placed;
}

const gatesOf = (logic: LogicPart, usedBy: readonly string[]): PackedGate[] =>
  Array.from({ length: logic.gatesPerPackage }, (_, index) => ({
    gate: gateLetter(index),
    inputs: logic.pinout?.[index]?.inputs ?? null,
    outputs: logic.pinout?.[index]?.outputs ?? null,
    usedBy: usedBy[index] ?? null,
  }));

/** A … Z, then by number. */
const gateLetter = (index: number): string => (index < 26 ? String.fromCharCode(65 + index) : String(index + 1));
