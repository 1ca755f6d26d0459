import type { NetPairs } from "./net-pairs";
import type { PointBook } from "./point-book";
import { fillTable, measurePads, type Pads, type Table } from "./pad-table";

/** In one cell each pad is held against so many others at most, so that a heap of pads on one spot cannot take for ever. */
const MOST_IN_A_CELL = 256;

/** Places come of other units: what is as near as this to the window lies within it. */
const ROUNDING_MM = 1e-6;

/**
 * Pairs of nets with pads whose edges lie at most `windowMm` apart on one side of the board. What lies between is not looked at,
 * so that the pairs are those in line of sight and some more. Every pad, widened by half the window, is put into the cells
 * that it touches; two pads are near only if they share a cell. Answers whether every pair could be looked at.
 */
export function neighboursByPlace(
  book: PointBook,
  chosen: readonly number[],
  windowMm: number,
  pairs: NetPairs,
  mostPairs: number,
): boolean {
  const reachMm = windowMm + 2 * ROUNDING_MM;
  const limit = (windowMm + ROUNDING_MM) ** 2;
  const pads = measurePads(book, chosen, reachMm / 2);
  if (pads.count < 2) return true;
  const table = fillTable(pads);
  let isComplete = true;
  for (let bucket = 0; bucket < table.first.length - 1; bucket += 1) {
    const begin = table.first[bucket] ?? 0;
    const end = table.first[bucket + 1] ?? 0;
    if (end - begin > MOST_IN_A_CELL) isComplete = false;
    for (let i = begin; i < end - 1; i += 1) {
      const last = Math.min(end, i + MOST_IN_A_CELL);
      if (!pairsWith(i, last, pads, table)) return false;
    }
  }
  return isComplete;

  /** Holds an entry of the table against those after it; false when there are too many pairs. */
  function pairsWith(
    at: number,
    last: number,
    { left, right, low, high, point, net, sides, cell }: Pads,
    { pad, column, row }: Table,
  ) {
    const one = pad[at] ?? 0;
    const oneNet = net[one] ?? 0;
    const oneSides = sides[one] ?? 0;
    const oneLeft = left[one] ?? 0;
    const oneRight = right[one] ?? 0;
    const oneLow = low[one] ?? 0;
    const oneHigh = high[one] ?? 0;
    for (let k = at + 1; k < last; k += 1) {
      const other = pad[k] ?? 0;
      const sharedLeft = Math.max(oneLeft, left[other] ?? 0);
      const sharedRight = Math.min(oneRight, right[other] ?? 0);
      if (sharedLeft > sharedRight) continue;
      const sharedLow = Math.max(oneLow, low[other] ?? 0);
      const sharedHigh = Math.min(oneHigh, high[other] ?? 0);
      if (sharedLow > sharedHigh) continue;
      if (net[other] === oneNet || ((sides[other] ?? 0) & oneSides) === 0) continue;
      // A pair that shares several cells counts in the one with the lower left corner of what they share.
      if (column[k] !== Math.floor(sharedLeft / cell) || row[k] !== Math.floor(sharedLow / cell)) continue;
      if (column[k] !== column[at] || row[k] !== row[at]) continue;
      // Both boxes are widened by half the reach: the gap is what they lack of overlapping by all of it.
      const gapX = Math.max(0, sharedLeft - sharedRight + reachMm);
      const gapY = Math.max(0, sharedLow - sharedHigh + reachMm);
      const gap = gapX * gapX + gapY * gapY;
      if (gap > limit) continue;
      if (pairs.size >= mostPairs) return false;
      pairs.add(point[one] ?? 0, point[other] ?? 0, gap);
    }
    return true;
  }
}
