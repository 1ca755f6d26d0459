import { familyAt, findFamily, type Family } from "../levels";
import type { PinAt } from "./finding";
import { grouped } from "./grouped";
import type { IndexedBoard, IndexedConnector, IndexedPin } from "./index-design";
import type { End, MachineIndex, PlacedBoard } from "./index-machine";
import type { Net } from "./net";
import { railBook, type RailBook } from "./rail-book";
import { signalBook, type SignalBook } from "./signal-book";
import { studyNet, type NetStudy } from "./study-net";

/** Everything the rules look at, worked out once for all of them. */
export type Survey = SignalBook & {
  index: MachineIndex;
  nets: NetStudy[];
  /** Without supply and ground: what drives those is told by the rules about supplies alone. */
  signalNets: NetStudy[];
  rails: RailBook;
  /** The family at the machine's logic supply; at its own where its figures do not reach that. */
  family(name: string): Family | undefined;
  /** "CON-01 a10"; with the connector where the board has several: "CON-01 J2 a10". */
  place(pin: PinAt): string;
  /** A pin of a design, shown at the first placement of the board. */
  pinOfDesign(pin: IndexedPin): PinAt;
  /** Where a design stands, in order. */
  placementsOf(board: IndexedBoard): PlacedBoard[];
  /** Connectors that meet this one, over all placements of its board. */
  partnersOf(connector: IndexedConnector): { at: PlacedBoard; partner: IndexedConnector; partnerAt: PlacedBoard }[];
};

export function surveyMachine(index: MachineIndex, nets: readonly Net[]): Survey {
  const { machine } = index;
  const placements = grouped(index.placed, ({ board }) => board.design.code);
  const partners = new Map<IndexedConnector, ReturnType<Survey["partnersOf"]>>();
  const meet = (one: End, other: End) => {
    const met = partners.get(one.connector) ?? [];
    met.push({ at: one.placed, partner: other.connector, partnerAt: other.placed });
    partners.set(one.connector, met);
  };
  for (const { from, to } of index.meetings) {
    meet(from, to);
    meet(to, from);
  }
  const studies = nets.map(studyNet);
  const placementsOf = ({ design }: IndexedBoard) => placements.get(design.code) ?? [];
  return {
    ...signalBook(machine),
    index,
    nets: studies,
    signalNets: studies.filter(({ power, ground }) => power.length === 0 && ground.length === 0),
    rails: railBook(machine),
    family: rememberFamilies(index),
    place: ({ label, board, connector, pin }) =>
      index.byCode.get(board)?.hasSeveralConnectors === false ? `${label} ${pin}` : `${label} ${connector} ${pin}`,
    pinOfDesign({ connector, name, signal }) {
      const placement = placements.get(connector.board)?.[0]?.placement;
      const { board, reference, id } = connector;
      const label = placement?.label ?? board;
      return { placement: placement?.id ?? "", label, board, connector: reference, connectorId: id, pin: name, signal };
    },
    placementsOf,
    partnersOf: (connector) => partners.get(connector) ?? [],
  };
}

function rememberFamilies({ machine }: MachineIndex): Survey["family"] {
  const known = new Map<string, Family | undefined>();
  return (name) => {
    if (!known.has(name)) {
      const family = findFamily(machine.families, name);
      const moved = family && familyAt(family, machine.conditions.logicVolts);
      known.set(name, moved?.ok ? moved.value : family);
    }
    return known.get(name);
  };
}
