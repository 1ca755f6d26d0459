import { byName } from "../check-graph";
import { pinName } from "../netlist";
import type { PointBook } from "./point-book";
import { route } from "./route";

/** Pairs of points in the order of probing. */
export type PointPairs = { a: number[]; b: number[] };

/**
 * n − 1 pairs for a net of n points: a chain through all of them, from neighbour to neighbour, so that one tip moves at a time and
 * a pair that reads open says between which two points the net is broken. Then an order of the nets with little walking
 * between the end of one chain and the beginning of the next.
 */
export function chainPairs(book: PointBook, nets: readonly (readonly number[])[]): PointPairs {
  const chains = nets.filter((points) => points.length > 1).map((points) => chainOf(book, points));
  const placed = chains.filter(([first]) => isPlaced(book, first));
  const ends = placed.map((chain) => chain.findLast((at) => isPlaced(book, at)));
  const starts = placed.map(([first]) => first);
  const { order, isTurned } = route({
    startX: Float64Array.from(starts, (at) => book.x[at ?? 0] ?? 0),
    startY: Float64Array.from(starts, (at) => book.y[at ?? 0] ?? 0),
    endX: Float64Array.from(ends, (at) => book.x[at ?? 0] ?? 0),
    endY: Float64Array.from(ends, (at) => book.y[at ?? 0] ?? 0),
  });
  const pairs: PointPairs = { a: [], b: [] };
  for (const at of order) addChain(pairs, placed[at] ?? [], isTurned[at] === 1);
  for (const chain of chains) if (!isPlaced(book, chain[0])) addChain(pairs, chain, false);
  return pairs;
}

/** Points with a place by nearness, then those without one by name. */
function chainOf(book: PointBook, points: readonly number[]): readonly number[] {
  const known = points.every((at) => isPlaced(book, at)) ? points : points.filter((at) => isPlaced(book, at));
  const chain = known.length < 3 ? known : routed(book, known);
  if (known === points) return chain;
  const unknown = points.filter((at) => !isPlaced(book, at)).map((at) => ({ at, name: nameOf(book, at) }));
  return [...chain, ...unknown.sort((one, other) => byName(one.name, other.name)).map(({ at }) => at)];
}

function routed({ x, y }: PointBook, points: readonly number[]): number[] {
  const [xs, ys] = [Float64Array.from(points, (at) => x[at] ?? 0), Float64Array.from(points, (at) => y[at] ?? 0)];
  const { order } = route({ startX: xs, startY: ys, endX: xs, endY: ys });
  return Array.from(order, (at) => points[at] ?? 0);
}

function addChain({ a, b }: PointPairs, chain: readonly number[], isTurned: boolean): void {
  for (let step = 1; step < chain.length; step += 1) {
    const at = isTurned ? chain.length - step : step;
    a.push(chain[isTurned ? at : at - 1] ?? 0);
    b.push(chain[isTurned ? at - 1 : at] ?? 0);
  }
}

/** Pairs of single points in an order with little walking: by the places halfway between the two; those without one at the end. */
export function orderPairs(book: PointBook, { a, b }: PointPairs): PointPairs {
  const halfway = (list: Float64Array, at: number) => ((list[a[at] ?? 0] ?? 0) + (list[b[at] ?? 0] ?? 0)) / 2;
  const all = a.map((_, at) => at);
  const known = all.filter((at) => !Number.isNaN(halfway(book.x, at)));
  const [x, y] = [
    Float64Array.from(known, (at) => halfway(book.x, at)),
    Float64Array.from(known, (at) => halfway(book.y, at)),
  ];
  const { order } = route({ startX: x, startY: y, endX: x, endY: y });
  const sorted = [
    ...Array.from(order, (at) => known[at] ?? 0),
    ...all.filter((at) => Number.isNaN(halfway(book.x, at))),
  ];
  return { a: sorted.map((at) => a[at] ?? 0), b: sorted.map((at) => b[at] ?? 0) };
}

const isPlaced = ({ x }: PointBook, at: number | undefined) => at !== undefined && !Number.isNaN(x[at]);

function nameOf({ points }: PointBook, at: number): string {
  const point = points[at];
  return point ? pinName(point) : "";
}
