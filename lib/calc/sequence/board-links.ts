import { byName } from "../check-graph";
import { assembleNets, studyNet, type Machine } from "../interconnect";
import { signalKey } from "../signal-names";
import type { BoardLink, BoardOrderInput } from "./board-order";
import { listNets } from "./list-nets";

/**
 * Which design carries, supplies or drives which other, from the nets of the assembled machine.
 * - drives: an output, three-state, open-drain or bidirectional pin of one and an input of the other are on one net.
 * - supplies: the source of a rail, and boards with supply pins on a net of its name. A passive backplane is not supplied:
 *   nothing in it can be damaged.
 * - carries: a backplane and whatever plugs into it.
 * Left out: units of one design that drive each other, drivers that only share a net, and what runs through passive pins.
 */
export function boardLinks({ machine, railSources }: Pick<BoardOrderInput, "machine" | "railSources">): BoardLink[] {
  const book = new Map<string, { from: string; to: string; kind: BoardLink["kind"]; nets: Set<string> }>();
  const add = (kind: BoardLink["kind"], from: string, to: string, net?: string) => {
    if (from === to) return;
    const key = `${kind}\u0000${from}\u0000${to}`;
    const link = book.get(key) ?? { from, to, kind, nets: new Set<string>() };
    if (net !== undefined) link.nets.add(net);
    book.set(key, link);
  };
  const sources = new Map(railSources.map(({ rail, board }) => [signalKey(rail), board]));
  for (const net of assembleNets(machine)) {
    const { drivers, receivers, power } = studyNet(net);
    const name = net.name === "" ? net.id : net.name;
    const [from, to] = [drivers, receivers].map((parties) => [
      ...new Set(parties.map(({ pins }) => pins[0]?.board ?? "")),
    ]);
    for (const one of from ?? []) for (const other of to ?? []) add("drives", one, other, name);
    const source = net.names.flatMap((one) => sources.get(signalKey(one)) ?? [])[0];
    if (source === undefined) continue;
    for (const { board, kind } of power) if (kind === "card") add("supplies", source, board, name);
  }
  for (const [from, to] of carried(machine)) add("carries", from, to);
  return [...book.values()]
    .map((link) => finished({ ...link, nets: [...link.nets].sort(byName) }))
    .sort((a, b) => byName(a.from, b.from) || byName(a.to, b.to) || byName(a.kind, b.kind));
}

/** Each backplane with the boards that meet it. */
function carried({ boards, placements, matings }: Machine): [string, string][] {
  const kindOf = new Map(boards.map(({ code, kind }) => [code, kind]));
  const boardAt = new Map(placements.map(({ id, board }) => [id, board]));
  return matings.flatMap(({ from, to }): [string, string][] => {
    const [one, other] = [boardAt.get(from.placement), boardAt.get(to.placement)];
    if (one === undefined || other === undefined || kindOf.get(one) === kindOf.get(other)) return [];
    return [kindOf.get(one) === "backplane" ? [one, other] : [other, one]];
  });
}

const finished = (link: Omit<BoardLink, "sentence">): BoardLink => ({ ...link, sentence: `${says(link)}.` });

/** "TIM drives CLK into SUM", without the full stop. */
export function says({ from, to, kind, nets }: Omit<BoardLink, "sentence">): string {
  if (kind === "carries") return `${from} carries the nets of ${to}`;
  if (kind === "said") return `${from} is said to come before ${to}`;
  return kind === "supplies"
    ? `${from} supplies ${to} with ${listNets(nets)}`
    : `${from} drives ${listNets(nets)} into ${to}`;
}
