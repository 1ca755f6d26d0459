import type { MachineIndex } from "./index-machine";
import type { Net } from "./net";
import { byName } from "./order";

/** Gives each net its name and id and puts the nets into order: named ones first, in natural order. */
export function nameNets(nets: Net[], { machine }: MachineIndex): Net[] {
  const known = new Set(machine.signals.map((signal) => signal.name));
  const count = new Map<string, number>();
  for (const net of nets) {
    setNames(net, known);
    count.set(net.name, (count.get(net.name) ?? 0) + 1);
  }
  const taken = new Set<string>();
  for (const net of nets) {
    const first = net.pins[0];
    const where = first ? `${first.label} ${first.connector} ${first.pin}` : "";
    const isAlone = net.name !== "" && count.get(net.name) === 1;
    const id = isAlone ? net.name : [net.name, where].filter(Boolean).join(" at ");
    // Two placements with one label: their ids tell them apart.
    net.id = taken.has(id) ? `${id} (${first?.placement ?? ""}, ${first?.connectorId ?? ""})` : id;
    taken.add(net.id);
  }
  return nets.sort(
    (a, b) => Number(a.name === "") - Number(b.name === "") || byName(a.name, b.name) || byName(a.id, b.id),
  );
}

/**
 * The name that most placements give; among equals the backplane's, which is the only one that differs from slot to
 * slot, then one that is known as a signal, then the first in natural order.
 */
function setNames(net: Net, known: ReadonlySet<string>): void {
  const placements = new Map<string, { count: number; last: string; isBackplanes: boolean }>();
  for (const { signal, placement, kind } of net.pins) {
    if (signal === "") continue;
    const seen = placements.get(signal) ?? { count: 0, last: "", isBackplanes: false };
    if (seen.last !== placement) seen.count += 1;
    seen.last = placement;
    seen.isBackplanes ||= kind === "backplane";
    placements.set(signal, seen);
  }
  const ranked = [...placements].map(([name, { count, isBackplanes }]) => ({
    name,
    rank: count * 4 + (isBackplanes ? 2 : 0) + (known.has(name) ? 1 : 0),
  }));
  net.names = ranked.map(({ name }) => name).sort(byName);
  net.name = ranked.sort((a, b) => b.rank - a.rank || byName(a.name, b.name))[0]?.name ?? "";
}
