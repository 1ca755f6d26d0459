import { indexDesign, type IndexedBoard, type IndexedConnector } from "./index-design";
import type { ConnectorAt, Machine, Mating, Placement } from "./machine";
import { byName, sortedOnce } from "./order";

export type PlacedBoard = {
  placement: Placement;
  board: IndexedBoard;
  /** Number of its first piece of copper among all of the machine. */
  firstCopper: number;
};

export type End = { placed: PlacedBoard; connector: IndexedConnector };

/** Two connectors that meet, both known. */
export type Meeting = { from: End; to: End };

export type MachineIndex = {
  machine: Machine;
  boards: IndexedBoard[];
  byCode: Map<string, IndexedBoard>;
  placed: PlacedBoard[];
  coppers: number;
  meetings: Meeting[];
  /** What the machine names but does not have: a sentence's worth each. */
  loose: { board: string; what: string }[];
};

const endName = ({ placement, connector }: ConnectorAt) => `${placement}\u0000${connector}`;

/** The same two connectors, whichever is said first. */
const inOrder = ({ from, to }: Mating): Mating =>
  byName(endName(from), endName(to)) <= 0 ? { from, to } : { from: to, to: from };

/** Puts boards, placements and matings into one order, resolves their references, and keeps what leads nowhere. */
export function indexMachine(machine: Machine): MachineIndex {
  const boards = sortedOnce(machine.boards, (board) => board.code).map(indexDesign);
  const byCode = new Map(boards.map((board) => [board.design.code, board]));
  const loose: MachineIndex["loose"] = [];
  const placed: PlacedBoard[] = [];
  let coppers = 0;
  const unique = sortedOnce(machine.placements, (placement) => placement.id);
  for (const placement of unique.sort((a, b) => byName(a.label, b.label) || byName(a.id, b.id))) {
    const board = byCode.get(placement.board);
    if (!board) {
      loose.push({ board: placement.board, what: `${placement.label} stands for a board that is not there` });
      continue;
    }
    placed.push({ placement, board, firstCopper: coppers });
    coppers += board.coppers;
  }
  const byPlacement = new Map(placed.map((one) => [one.placement.id, one]));
  const find = ({ placement, connector }: ConnectorAt): End | undefined => {
    const at = byPlacement.get(placement);
    const found = at?.board.byConnector.get(connector);
    if (at && found) return { placed: at, connector: found };
    loose.push({
      board: at?.placement.board ?? "",
      what: at
        ? `${at.placement.label} is put together by a connector that it does not have`
        : "Two connectors are put together of which one stands nowhere",
    });
    return undefined;
  };
  const matings = sortedOnce(machine.matings.map(inOrder), ({ from, to }) => `${endName(from)}\u0001${endName(to)}`);
  const meetings = matings.flatMap(({ from, to }): Meeting[] => {
    const [one, other] = [find(from), find(to)];
    const isItself = endName(from) === endName(to);
    return one && other && !isItself ? [{ from: one, to: other }] : [];
  });
  return { machine, boards, byCode, placed, coppers, meetings, loose };
}
