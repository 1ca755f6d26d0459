import { listed } from "../listed";
import type { NetPoint, Netlist } from "../netlist";
import { pinsInTwoNets } from "../pins-in-two-nets";
import type { NetlistReading } from "../reading";
import { cutNameWarnings } from "./cut-names";
import type { IpcReader } from "./reader";
import type { IpcScale } from "./scale";
import { unitsWarning } from "./units-warning";

/** Gives the nets their long names, the points their sides, and says what the file as a whole leaves open. */
export function assemble(reader: IpcReader, ownScale: IpcScale | undefined): NetlistReading {
  const { header, warnings } = reader;
  const fullName = (name: string) => header.longNames.get(name) ?? name;
  const nets = reader.nets.finish(fullName);
  const { unconnected } = reader.nets;
  reader.access.settle();
  const names = new Set(nets.map(({ name }) => name));
  const resolve = (name: string) => (names.has(fullName(name)) ? fullName(name) : undefined);
  const adjacent = reader.neighbours.finish(resolve, (line, reason) => warnings.add(line, reason));
  const points = [...nets.map((net) => net.points), unconnected];

  const nameless = [...names].filter((name) => /^NNAME\S/.test(name));
  const ownNames = [...names].filter((name) => reader.nets.has(name));
  const whole = [
    points.every((some) => some.length === 0)
      ? "The file holds no point that can be used."
      : unitsWarning(header, nets, ownScale),
    reader.endLine === 0 ? "There is no end record (999): the file may be cut off." : "",
    nameless.length > 0 ? `The long name of ${listed(nameless)} stands nowhere in the file.` : "",
    ...cutNameWarnings(ownNames, new Set(header.longNames.values())),
  ];
  for (const warning of whole) if (warning !== "") warnings.add(0, warning);
  for (const { pin, line, net, before } of pinsInTwoNets(nets)) {
    warnings.add(line, `${pin} belongs to ${before} already and is named for ${net}, too.`);
  }

  const netlist: Netlist = {
    source: "ipc-d-356",
    nets,
    unconnected,
    adjacent,
    outlines: reader.outlines.finish(),
    toolingHoles: reader.toolingHoles,
    places: points.some((some) => some.some(({ xMm }) => xMm !== null)) ? "board" : "none",
    facts: header.facts,
  };
  return {
    netlist,
    passedOver: reader.passedOver.finish(),
    warnings: warnings.finish(),
    read: summary(netlist, points, reader.counts),
  };
}

const KINDS: [NetPoint["kind"], string][] = [
  ["through", "points with a hole"],
  ["surface", "surface pads"],
  ["via", "vias"],
];

function summary(netlist: Netlist, points: readonly NetPoint[][], counts: ReadonlyMap<string, number>) {
  const kinds = new Map<string, number>();
  for (const some of points) for (const { kind } of some) kinds.set(kind, (kinds.get(kind) ?? 0) + 1);
  return [
    { what: "nets", count: netlist.nets.length },
    ...KINDS.map(([kind, what]) => ({ what, count: kinds.get(kind) ?? 0 })),
    { what: "unconnected points", count: netlist.unconnected.length },
    { what: "pairs of neighbours", count: netlist.adjacent.length },
    { what: "outlines", count: netlist.outlines.length },
    { what: "tooling holes and marks", count: netlist.toolingHoles.length },
    ...[...counts].map(([what, count]) => ({ what, count })),
  ].filter(({ count }) => count > 0);
}
