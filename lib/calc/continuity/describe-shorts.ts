import { listed, pinName } from "../netlist";
import { components } from "./crossed";
import type { ContinuityFinding } from "./finding";
import type { Said, Study } from "./study";

/** Joints as near as this are bridged by solder, mm (common practice, no source). */
const BRIDGE_MM = 6;
const MOST_NAMED = 3;

/** Nets that touch, merged: if A touches B and B touches C, the three are one finding. */
export function describeShorts(study: Study, joins: readonly Said[]): ContinuityFinding[] {
  const { book, netOf } = study;
  const groups = components(joins.map(({ probe }) => [netOf(probe.a), netOf(probe.b)]));
  return groups.map((nets) => {
    const own = joins.filter(({ probe }) => nets.includes(netOf(probe.a)));
    const sorted = [...nets].sort((one, other) => one - other);
    const names = sorted.map((net) => book.netName(net));
    const points = [...new Set(own.flatMap(({ probe }) => [probe.a, probe.b]))];
    const where = own.slice(0, MOST_NAMED).map(({ probe }) => `${book.label(probe.a)} and ${book.label(probe.b)}`);
    const open = sorted.filter((net) => study.pieces.has(net)).map((net) => book.netName(net));
    return {
      kind: "short" as const,
      nets: names,
      pieces: sorted.map((net) => points.filter((point) => netOf(point) === net)),
      pins: points.map((point) => book.label(point)),
      probes: own.map(({ probe }) => probe.id),
      sentence: `${listed(names)} touch: copper joins ${where.join("; ")}${own.length > MOST_NAMED ? `; and ${own.length - MOST_NAMED} more pairs` : ""}.`,
      lookAt: whereToLook(study, own),
      mendFirst: open.length === 0 ? "" : mendFirst(open),
    };
  });
}

export const mendFirst = (names: readonly string[]): string =>
  `Mend the open in ${listed(names)} first, then probe again: until then it is known only of one piece.`;

function whereToLook({ book }: Study, joins: readonly Said[]): string {
  const near = joins.find(({ probe: { a, b } }) => isNear(book.points[a], book.points[b]));
  if (near) {
    return `Look for a bridge of solder between ${book.label(near.probe.a)} and ${book.label(near.probe.b)}.`;
  }
  return "Look where the two nets run side by side, and at the parts that both of them lead to.";
}

type Spot = Study["book"]["points"][number] | undefined;

function isNear(one: Spot, other: Spot): boolean {
  if (!one || !other) return false;
  if (one.xMm === null || one.yMm === null || other.xMm === null || other.yMm === null) {
    return one.part === other.part && pinName(one) !== "";
  }
  return Math.hypot(one.xMm - other.xMm, one.yMm - other.yMm) <= BRIDGE_MM;
}
