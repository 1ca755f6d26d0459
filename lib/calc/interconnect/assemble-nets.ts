import { DisjointSets } from "./disjoint-sets";
import type { IndexedPin } from "./index-design";
import { indexMachine, type MachineIndex, type Meeting, type PlacedBoard } from "./index-machine";
import type { Machine } from "./machine";
import { nameNets } from "./name-nets";
import type { Net, NetPin } from "./net";

/** For a meeting that is listed mirrored: which pin of the second connector each pin of the first one really meets. */
export type Crossing = (meeting: Meeting) => ((pin: string) => string) | undefined;

/** The nets of the assembled machine, in natural order of their names; near-linear in the number of pins. */
export const assembleNets = (machine: Machine): Net[] => joinNets(indexMachine(machine));

export function joinNets(index: MachineIndex, crossing: Crossing = () => undefined): Net[] {
  const copper = new DisjointSets(index.coppers);
  const mated = new Set<string>();
  for (const meeting of index.meetings) {
    const { from, to } = meeting;
    const crossed = crossing(meeting);
    for (const pin of from.connector.pins) {
      for (const other of to.connector.byName.get(crossed ? crossed(pin.key) : pin.key) ?? []) {
        copper.join(from.placed.firstCopper + pin.copper, to.placed.firstCopper + other.copper);
      }
    }
    if (to.connector.pins.length > 0) mated.add(endKey(from.placed, from.connector.id));
    if (from.connector.pins.length > 0) mated.add(endKey(to.placed, to.connector.id));
  }
  const nets = new Map<number, Net>();
  for (const placed of index.placed) {
    const isMated = new Map(placed.board.connectors.map(({ id }) => [id, mated.has(endKey(placed, id))]));
    for (const pin of placed.board.pins) {
      const root = copper.find(placed.firstCopper + pin.copper);
      let net = nets.get(root);
      if (!net) {
        net = { id: "", name: "", names: [], pins: [], placements: [] };
        nets.set(root, net);
      }
      net.pins.push(netPin(placed, pin, isMated.get(pin.connector.id) ?? false));
      if (net.placements.at(-1) !== placed.placement.id) net.placements.push(placed.placement.id);
    }
  }
  return nameNets([...nets.values()], index);
}

const endKey = ({ placement }: PlacedBoard, connector: string) => `${placement.id}\u0000${connector}`;

function netPin(
  { placement, board }: PlacedBoard,
  { design, connector, name, signal }: IndexedPin,
  isMated: boolean,
): NetPin {
  return {
    placement: placement.id,
    label: placement.label,
    board: placement.board,
    connector: connector.reference,
    connectorId: connector.id,
    pin: name,
    signal,
    role: design.role,
    family: design.family.trim(),
    loads: Number.isFinite(design.loads) ? Math.max(0, Math.trunc(design.loads)) : 0,
    enableGroup: design.enableGroup.trim(),
    pullUpOhm: design.pullUpOhm !== null && design.pullUpOhm > 0 ? design.pullUpOhm : null,
    kind: board.design.kind,
    slot: placement.slot,
    isMated,
  };
}
