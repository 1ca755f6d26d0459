import type { Machine } from "@/lib/calc/interconnect";
import type { PoweredPlacement } from "@/lib/calc/power";

type Contacts = PoweredPlacement["contacts"];

/**
 * Contacts of a placement for each rail and for ground, on connectors that are put together; null while its pin map is
 * empty, and for the backplane, at which all others meet.
 */
export function contactsOf(machine: Machine, placementId: string): Contacts {
  const placement = machine.placements.find((one) => one.id === placementId);
  const board = machine.boards.find((one) => one.code === placement?.board);
  if (!board || board.kind === "backplane") return null;
  const mated = new Set(
    machine.matings
      .flatMap(({ from, to }) => [from, to])
      .filter((at) => at.placement === placementId)
      .map((at) => at.connector),
  );
  const pins = board.connectors.filter(({ id }) => mated.has(id)).flatMap((connector) => connector.pins);
  if (pins.length === 0) return null;
  const named = (rail: string) => [rail, ...(machine.signals.find(({ name }) => name === rail)?.aliases ?? [])];
  const rails = machine.rails.map(({ name }) => {
    const names = named(name);
    const count = pins.filter(({ role, signal }) => role === "power" && names.includes(signal)).length;
    return { rail: name, count };
  });
  return { rails, ground: pins.filter(({ role }) => role === "ground").length };
}
