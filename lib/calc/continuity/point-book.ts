import { pinName, type Netlist, type NetPoint } from "../netlist";
import type { PointNumber } from "./plan";

/** No board reaches so far: such a place is not known. */
const FAR_MM = 100_000;

/**
 * Every point of a netlist by its number: nets in their order, points in theirs, then the unconnected points, each of which counts
 * as a net of its own.
 */
export type PointBook = {
  points: readonly NetPoint[];
  /** Nets of the netlist; numbers from here on are unconnected points. */
  named: number;
  /** Nets and unconnected points. */
  nets: number;
  /** Number of the net of every point. */
  netOf: Int32Array;
  /** Number of the first point of every net, and one more at the end. */
  firstOf: Int32Array;
  /** mm; NaN where the place is not known. */
  x: Float64Array;
  y: Float64Array;
  netName(net: number): string;
  /** "U1-3", "the via at 37.8, 3.7 mm". */
  label(point: PointNumber): string;
};

export function pointBook({ nets, unconnected }: Pick<Netlist, "nets" | "unconnected">): PointBook {
  const points: NetPoint[] = [];
  const firstOf = new Int32Array(nets.length + unconnected.length + 1);
  nets.forEach((net, at) => {
    firstOf[at] = points.length;
    for (const point of net.points) points.push(point);
  });
  unconnected.forEach((point, at) => {
    firstOf[nets.length + at] = points.length;
    points.push(point);
  });
  firstOf[nets.length + unconnected.length] = points.length;
  const netOf = new Int32Array(points.length);
  for (let net = 0; net < firstOf.length - 1; net += 1) netOf.fill(net, firstOf[net], firstOf[net + 1]);
  const [x, y] = [new Float64Array(points.length), new Float64Array(points.length)];
  points.forEach(({ xMm, yMm }, at) => {
    const isPlaced = xMm !== null && yMm !== null && Math.abs(xMm) < FAR_MM && Math.abs(yMm) < FAR_MM;
    x[at] = isPlaced ? xMm : Number.NaN;
    y[at] = isPlaced ? yMm : Number.NaN;
  });
  const label = (at: PointNumber) => labelOf(points[at]);
  return {
    points,
    named: nets.length,
    nets: firstOf.length - 1,
    netOf,
    firstOf,
    x,
    y,
    netName: (net) => nets[net]?.name ?? `${label(firstOf[net] ?? -1)} (no net)`,
    label,
  };
}

function labelOf(point: NetPoint | undefined): string {
  if (!point) return "no point";
  const name = pinName(point);
  if (name !== "") return name;
  const what = point.kind === "via" ? "via" : "pad";
  return point.xMm === null || point.yMm === null
    ? `a ${what}`
    : `the ${what} at ${point.xMm.toFixed(1)}, ${point.yMm.toFixed(1)}\u202fmm`;
}
