import { BucketGrid } from "./bucket-grid";
import { squared } from "./squared";
import type { Route, Ways } from "./ways";

/** Up to so many ways each step looks at all that are left; beyond that a grid finds the nearest. */
const FEW = 24;

/** Always to the nearest end that is left, from the lower left on. */
export function goToNearest({ startX, startY, endX, endY }: Ways): Route {
  const count = startX.length;
  const found: Route = { order: new Int32Array(count), isTurned: new Uint8Array(count) };
  if (count === 0) return found;
  const next = count <= FEW ? amongFew(startX, startY, endX, endY) : onGrid(startX, startY, endX, endY);
  let entry = lowestLeft(startX, startY);
  for (let at = 0; at < count && entry >= 0; at += 1) {
    const way = entry % count;
    const isTurned = entry >= count;
    found.order[at] = way;
    found.isTurned[way] = isTurned ? 1 : 0;
    entry = next(way, (isTurned ? startX : endX)[way] ?? 0, (isTurned ? startY : endY)[way] ?? 0);
  }
  return found;
}

/** Takes a way out and answers the entry nearest to a place: a way's number, or that plus their count for its end. */
type Next = (taken: number, x: number, y: number) => number;

function amongFew(startX: Float64Array, startY: Float64Array, endX: Float64Array, endY: Float64Array): Next {
  const count = startX.length;
  const isTaken = new Uint8Array(count);
  return (taken, x, y) => {
    isTaken[taken] = 1;
    let best = -1;
    let bestSquared = Infinity;
    for (let way = 0; way < count; way += 1) {
      if (isTaken[way] === 1) continue;
      const toStart = squared(startX[way] ?? 0, startY[way] ?? 0, x, y);
      const toEnd = squared(endX[way] ?? 0, endY[way] ?? 0, x, y);
      if (toStart < bestSquared) [best, bestSquared] = [way, toStart];
      if (toEnd < bestSquared) [best, bestSquared] = [way + count, toEnd];
    }
    return best;
  };
}

function onGrid(startX: Float64Array, startY: Float64Array, endX: Float64Array, endY: Float64Array): Next {
  const count = startX.length;
  const arePlaces = startX === endX && startY === endY;
  const grid = arePlaces ? new BucketGrid(startX, startY) : new BucketGrid(joined(startX, endX), joined(startY, endY));
  return (taken, x, y) => {
    grid.take(taken);
    if (!arePlaces) grid.take(taken + count);
    return grid.nearest(x, y);
  };
}

function joined(one: Float64Array, other: Float64Array): Float64Array {
  const both = new Float64Array(one.length + other.length);
  both.set(one);
  both.set(other, one.length);
  return both;
}

function lowestLeft(x: Float64Array, y: Float64Array): number {
  let best = 0;
  for (let at = 1; at < x.length; at += 1) {
    if ((x[at] ?? 0) + (y[at] ?? 0) < (x[best] ?? 0) + (y[best] ?? 0)) best = at;
  }
  return best;
}
