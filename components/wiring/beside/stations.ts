import type { Connector } from "@/lib/calc/connector";
import type { Machine, Net } from "@/lib/calc/interconnect";
import type { ConnectorView, WiringSlot } from "@/lib/pin-map/load-wiring";

/** A place where a connector stands in the machine, for the row of small faces. */
export type Station = {
  key: string;
  /** "slot 3", or the board where it stands in no slot. */
  label: string;
  /** Who sits there: "CON-01", or the board that is meant for it; empty where none is. */
  who: string;
  isSlot: boolean;
  face: Connector;
  /** Connectors that are this place, at their placements: the slot's and the one plugged into it. */
  at: readonly { placement: string; connectorId: string }[];
};

type Given = { machine: Machine; connectors: readonly ConnectorView[]; slots: readonly WiringSlot[] };

/** Every slot's connector in the order of the slots, and after them the connectors that stand in none. */
export function stationsOf({ machine, connectors, slots }: Given): Station[] {
  const designs = new Map(machine.boards.flatMap((board) => board.connectors.map((one) => [one.id, one] as const)));
  const placementsOf = (code: string) => machine.placements.filter(({ board }) => board === code);
  const plugged = new Set<string>();
  const inSlots = connectors.flatMap((connector): Station[] => {
    const slot = slots.find(({ id }) => id === connector.slotId);
    const face = designs.get(connector.id)?.face;
    const own = placementsOf(connector.code)[0];
    if (!slot || !face || !own) return [];
    const met = machine.matings.flatMap(({ from, to }) => {
      const isHere = from.placement === own.id && from.connector === connector.id;
      return isHere && machine.placements.find(({ id }) => id === to.placement)?.slot === slot.position ? [to] : [];
    });
    const here = [{ placement: own.id, connector: connector.id }, ...met];
    for (const { placement, connector: id } of here) plugged.add(`${placement} ${id}`);
    const sitting = machine.placements.find((one) => one.slot === slot.position);
    const who = sitting?.label.includes(" in slot ") ? sitting.board : (sitting?.label ?? "");
    const at = here.map(({ placement, connector: connectorId }) => ({ placement, connectorId }));
    return [
      { key: `slot ${slot.position} ${connector.id}`, label: `slot ${slot.position}`, who, isSlot: true, face, at },
    ];
  });
  const others = connectors.flatMap((connector): Station[] => {
    const face = designs.get(connector.id)?.face;
    if (!face) return [];
    return placementsOf(connector.code)
      .filter(({ id }) => !plugged.has(`${id} ${connector.id}`))
      .map(({ id, label }) => ({
        key: `${id} ${connector.id}`,
        label: `${label} ${connector.reference}`,
        who: "",
        isSlot: false,
        face,
        at: [{ placement: id, connectorId: connector.id }],
      }));
  });
  const number = ({ label }: Station) => Number(label.replace(/\D/g, ""));
  return [...inSlots.sort((one, other) => number(one) - number(other)), ...others];
}

/** Pins of the net at this place; a slot's pin and the card's on it are one. */
export const litAt = ({ at }: Station, net: Net | undefined): string[] => [
  ...new Set(
    (net?.pins ?? [])
      .filter(({ placement, connectorId }) =>
        at.some((one) => one.placement === placement && one.connectorId === connectorId),
      )
      .map(({ pin }) => pin),
  ),
];
