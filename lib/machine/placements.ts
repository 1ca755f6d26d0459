import type { Mating, Placement } from "@/lib/calc/interconnect";
import type { findMachineBoards, findMachineConnectors, findMachineSlots } from "@/db/queries/machine";

type Rows<Query extends (...args: never[]) => Promise<unknown[]>> = Awaited<ReturnType<Query>>;
export type MachineRows = {
  boards: Rows<typeof findMachineBoards>;
  slots: Rows<typeof findMachineSlots>;
  connectors: Rows<typeof findMachineConnectors>;
};

type Placed = Placement & { boardId: string; slotId: string | null };

/**
 * Where each board stands: the backplane once, a card in every slot that is meant for it, with the unit that sits there
 * or planned; a card that no slot is meant for stands beside the rack, once.
 */
export function placementsOf({ boards, slots }: MachineRows): Placed[] {
  const inSlots = slots.flatMap((slot): Placed[] => {
    const board = boards.find((one) => one.id === slot.boardId);
    if (!board) return [];
    const label = slot.serial ?? `${board.code} in slot ${slot.position}`;
    const ids = { boardId: board.id, slotId: slot.id };
    return [{ id: `slot ${slot.position}`, board: board.code, label, slot: slot.position, ...ids }];
  });
  const beside = boards
    .filter((board) => board.kind === "backplane" || !inSlots.some((one) => one.boardId === board.id))
    .map((board): Placed => {
      const label = board.onlySerial ?? board.code;
      return { id: `board ${board.code}`, board: board.code, label, slot: null, boardId: board.id, slotId: null };
    });
  return [...beside, ...inSlots];
}

/** Which connectors meet: a slot's connector and the card's, and the two ends of a cable. */
export function matingsOf({ boards, connectors }: MachineRows, placed: readonly Placed[]): Mating[] {
  const backplanes = new Set(boards.filter((board) => board.kind === "backplane").map((board) => board.id));
  const standsAt = (boardId: string) => placed.find((one) => one.boardId === boardId);
  return connectors.flatMap((connector): Mating[] => {
    const own = standsAt(connector.boardId);
    if (!own) return [];
    const from = { placement: own.id, connector: connector.id };
    const met: Mating[] = [];
    const card = placed.find((one) => one.slotId !== null && one.slotId === connector.slotId);
    if (card && backplanes.has(connector.boardId)) {
      const taken = connectors.find((one) => one.boardId === card.boardId && one.reference === connector.takes);
      if (taken) met.push({ from, to: { placement: card.id, connector: taken.id } });
    }
    const cable = connectors.find((one) => one.id === connector.cabledTo);
    const far = cable && standsAt(cable.boardId);
    if (cable && far) met.push({ from, to: { placement: far.id, connector: cable.id } });
    return met;
  });
}
