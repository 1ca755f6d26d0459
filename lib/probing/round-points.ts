import type { Probe } from "@/lib/calc/continuity";
import { pinName, type Netlist, type NetPoint } from "@/lib/calc/netlist";
import type { RoundPoint, RoundProbe } from "./round-view";

/** By their numbers: nets in their order, points in theirs, then the unconnected ones. */
export function pointsOf({ nets, unconnected }: Netlist): RoundPoint[] {
  const all: RoundPoint[] = [];
  for (const { name, points } of nets) for (const point of points) all.push(shown(point, name));
  for (const point of unconnected) all.push(shown(point, ""));
  return all;
}

const shown = (point: NetPoint, net: string): RoundPoint => {
  const { xMm, yMm } = point;
  return { name: nameOf(point), net, xMm, yMm };
};

/** A via has no name of its own; it goes by its place. */
function nameOf(point: NetPoint): string {
  const name = pinName(point);
  if (name !== "") return name;
  const { xMm, yMm } = point;
  return xMm === null || yMm === null ? "via" : `via ${xMm.toFixed(2)}/${yMm.toFixed(2)}`;
}

/** The probes with those points only that they use. */
export function shownProbes(
  all: readonly RoundPoint[],
  probes: readonly Probe[],
): { points: RoundPoint[]; probes: RoundProbe[] } {
  const points: RoundPoint[] = [];
  const at = new Map<number, number>();
  const place = (number: number): number => {
    const known = at.get(number);
    if (known !== undefined) return known;
    at.set(number, points.length);
    points.push(all[number] ?? { name: "?", net: "", xMm: null, yMm: null });
    return points.length - 1;
  };
  const used = probes.map(({ a, b, expect, kind }) => ({ a: place(a), b: place(b), expect, kind }));
  return { points, probes: used };
}
