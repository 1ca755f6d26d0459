import { signalKey, signalKeys } from "../signal-names";
import type { PlanOptions } from "./plan";
import type { PointBook } from "./point-book";
import { isRailName } from "./rail-name";
import { isInReach } from "./reach";

/** What the options leave of a netlist. */
export type Choice = {
  /** Points to be joined with each other, by number of the net; empty where there is nothing to probe. */
  chains: number[][];
  /** Points that may lie beside each other, net by net. */
  candidates: number[];
  /** By number of the net: isolation of a pair counts when one of both is wanted. */
  isWanted: Uint8Array;
  isRail: Uint8Array;
  leftOut: { hidden: number; vias: number; unconnected: number };
};

export function choosePoints(book: PointBook, options: PlanOptions): Choice {
  const { chosen, leftOut } = pointsInReach(book, options);
  const isRail = new Uint8Array(book.nets);
  const ownRails = new Set(options.rails?.map(signalKey));
  const wanted = options.signals && new Set(options.signals.flatMap(signalKeys));
  const isWanted = new Uint8Array(book.nets).fill(1);
  for (let net = 0; net < book.nets; net += 1) {
    const name = net < book.named ? book.netName(net) : "";
    if (name !== "" && (isRailName(name) || ownRails.has(signalKey(name)))) isRail[net] = 1;
    if (options.railsOnly === true && isRail[net] === 0) isWanted[net] = 0;
    if (wanted && !wanted.has(signalKey(name))) isWanted[net] = 0;
  }
  const connector = options.connector?.trim().toUpperCase();
  const isOnIt = (at: number) => book.points[at]?.part.toUpperCase() === connector;
  const chains = chosen.map((points, net) => {
    if (isWanted[net] === 0) return [];
    return connector === undefined ? points : throughConnector(points, isOnIt, book);
  });
  const candidates = chosen.flat();
  return {
    chains,
    candidates: connector === undefined ? candidates : candidates.filter(isOnIt),
    isWanted,
    isRail,
    leftOut,
  };
}

/** The connector's own pins, and the nearest point of the rest of the net, to which they must lead. */
function throughConnector(points: readonly number[], isOnIt: (at: number) => boolean, { x, y }: PointBook): number[] {
  const own = points.filter(isOnIt);
  const [first] = own;
  if (first === undefined) return [];
  let best: number | undefined;
  let bestSquared = Infinity;
  for (const at of points) {
    if (isOnIt(at)) continue;
    const squared = ((x[at] ?? 0) - (x[first] ?? 0)) ** 2 + ((y[at] ?? 0) - (y[first] ?? 0)) ** 2;
    if (best === undefined || squared < bestSquared) [best, bestSquared] = [at, squared];
  }
  return best === undefined ? own : [best, ...own];
}

/** Vias and mid-points are left out of nets that have ends; what no tip can touch always is. */
function pointsInReach(book: PointBook, options: PlanOptions): { chosen: number[][]; leftOut: Choice["leftOut"] } {
  const leftOut = { hidden: 0, vias: 0, unconnected: 0 };
  const chosen: number[][] = [];
  for (let net = 0; net < book.nets; net += 1) {
    const [ends, between]: [number[], number[]] = [[], []];
    for (let at = book.firstOf[net] ?? 0; at < (book.firstOf[net + 1] ?? 0); at += 1) {
      const point = book.points[at];
      if (!point) continue;
      if (!isInReach(point)) leftOut.hidden += 1;
      else if (point.kind === "via" || point.isMidPoint) between.push(at);
      else ends.push(at);
    }
    if (net >= book.named && options.unconnected !== true) {
      leftOut.unconnected += 1;
      chosen.push([]);
    } else if (options.vias === true || ends.length === 0) {
      for (const at of between) ends.push(at);
      chosen.push(ends);
    } else {
      leftOut.vias += between.length;
      chosen.push(ends);
    }
  }
  return { chosen, leftOut };
}
