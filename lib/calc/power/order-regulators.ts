import { computed, fault, type Computed } from "../computed";
import { type RegulatorItem } from "./item";

type Indexed = { item: RegulatorItem; row: string };

/**
 * Regulators in the order in which their currents can be added up: each after all that take their current from the rail
 * that it makes. Refused: two that make one rail, and regulators that feed each other, with their names in order.
 */
export function orderRegulators(regulators: readonly Indexed[]): Computed<RegulatorItem[]> {
  const makers = new Map<string, Indexed>();
  for (const one of regulators) {
    const other = makers.get(one.item.output);
    if (other)
      return fault(one.row, `${one.item.label} and ${other.item.label} both make ${one.item.output}. One of them may.`);
    makers.set(one.item.output, one);
  }
  const depth = new Map<string, number>();
  for (const one of regulators) {
    const path: Indexed[] = [];
    for (let at: Indexed | undefined = one; at; at = makers.get(at.item.rail)) {
      if (path.includes(at)) {
        const members = [...path.slice(path.indexOf(at)), at].map(({ item }) => item.label).join(" → ");
        return fault(at.row, `Regulators feed each other: ${members}.`);
      }
      path.push(at);
    }
    depth.set(one.item.output, path.length);
  }
  const sorted = [...regulators].sort((a, b) => (depth.get(b.item.output) ?? 0) - (depth.get(a.item.output) ?? 0));
  return computed(sorted.map(({ item }) => item));
}
