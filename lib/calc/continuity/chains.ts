import { byName } from "../check-graph";
import { pinName } from "../netlist";
import type { PointBook } from "./point-book";
import { route } from "./route";
import { squared } from "./squared";

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

/** Most nets have a few points only; for these the nearest one each time does, without tables. */
const FEW = 6;

function routed(book: PointBook, points: readonly number[]): readonly number[] {
  if (points.length <= FEW) return nearestEachTime(book, points);
  const [xs, ys] = [new Float64Array(points.length), new Float64Array(points.length)];
  points.forEach((point, at) => {
    xs[at] = book.x[point] ?? 0;
    ys[at] = book.y[point] ?? 0;
  });
  const { order } = route({ startX: xs, startY: ys, endX: xs, endY: ys });
  return Array.from(order, (at) => points[at] ?? 0);
}

/** From the lower left on. */
function nearestEachTime({ x, y }: PointBook, points: readonly number[]): number[] {
  const chain = [...points];
  let [fromX, fromY] = [-1e6, -1e6];
  for (let at = 0; at < chain.length - 1; at += 1) {
    let [best, bestSquared] = [at, Infinity];
    for (let i = at; i < chain.length; i += 1) {
      const apart = squared(fromX, fromY, x[chain[i] ?? 0] ?? 0, y[chain[i] ?? 0] ?? 0);
      if (apart < bestSquared) [best, bestSquared] = [i, apart];
    }
    const next = chain[best] ?? 0;
    chain[best] = chain[at] ?? 0;
    chain[at] = next;
    fromX = x[next] ?? 0;
    fromY = y[next] ?? 0;
  }
  return chain;
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
  const [x, y] = [new Float64Array(a.length), new Float64Array(a.length)];
  const [known, unknown]: [number[], number[]] = [[], []];
  for (let at = 0; at < a.length; at += 1) {
    const [one, other] = [a[at] ?? 0, b[at] ?? 0];
    const halfway = ((book.x[one] ?? 0) + (book.x[other] ?? 0)) / 2;
    if (Number.isNaN(halfway)) {
      unknown.push(at);
      continue;
    }
    x[known.length] = halfway;
    y[known.length] = ((book.y[one] ?? 0) + (book.y[other] ?? 0)) / 2;
    known.push(at);
  }
  const [xs, ys] = [x.subarray(0, known.length), y.subarray(0, known.length)];
  const { order } = route({ startX: xs, startY: ys, endX: xs, endY: ys });
  const sorted: PointPairs = { a: [], b: [] };
  const take = (at: number) => {
    sorted.a.push(a[at] ?? 0);
    sorted.b.push(b[at] ?? 0);
  };
  for (const at of order) take(known[at] ?? 0);
  for (const at of unknown) take(at);
  return sorted;
}

const isPlaced = ({ x }: PointBook, at: number | undefined) => at !== undefined && !Number.isNaN(x[at]);

function nameOf({ points }: PointBook, at: number): string {
  const point = points[at];
  return point ? pinName(point) : "";
}
