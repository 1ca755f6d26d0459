import type { NetPairs } from "./net-pairs";
import type { PointBook } from "./point-book";
import { fillTable, measurePads } from "./pad-table";
import { shareASide } from "./reach";

/** In one cell each pad is held against so many others at most, so that a heap of pads on one spot cannot take for ever. */
const MOST_IN_A_CELL = 128;

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
  const pads = measurePads(book, chosen, windowMm / 2);
  const { count, left, right, low, high, cell } = pads;
  if (count < 2) return true;
  const table = fillTable(pads);
  const limit = windowMm * windowMm + 1e-9;
  let isComplete = true;
  for (let bucket = 0; bucket < table.first.length - 1; bucket += 1) {
    const end = table.first[bucket + 1] ?? 0;
    for (let i = table.first[bucket] ?? 0; i < end; i += 1) {
      const [one, column, row] = [table.pad[i] ?? 0, table.column[i] ?? 0, table.row[i] ?? 0];
      const p = pads.point[one] ?? 0;
      const last = Math.min(end, i + 1 + MOST_IN_A_CELL);
      if (last < end) isComplete = false;
      for (let k = i + 1; k < last; k += 1) {
        const other = table.pad[k] ?? 0;
        // A pair that shares several cells counts in the one with the lower left corner of what they share.
        if (table.column[k] !== column || table.row[k] !== row) continue;
        const sharedLeft = Math.max(left[one] ?? 0, left[other] ?? 0);
        const sharedLow = Math.max(low[one] ?? 0, low[other] ?? 0);
        if (Math.floor(sharedLeft / cell) !== column || Math.floor(sharedLow / cell) !== row) continue;
        const q = pads.point[other] ?? 0;
        if (book.netOf[p] === book.netOf[q]) continue;
        // Pads widened by half the window on each side: the gap is what they lack of overlapping by a whole window.
        const gapX = Math.max(0, sharedLeft - Math.min(right[one] ?? 0, right[other] ?? 0) + windowMm);
        const gapY = Math.max(0, sharedLow - Math.min(high[one] ?? 0, high[other] ?? 0) + windowMm);
        const gap = gapX * gapX + gapY * gapY;
        if (gap > limit || !sideBySide(book, p, q)) continue;
        if (pairs.size >= mostPairs) return false;
        pairs.add(p, q, gap);
      }
    }
  }
  return isComplete;
}

function sideBySide({ points }: PointBook, one: number, other: number): boolean {
  const [a, b] = [points[one], points[other]];
  return a !== undefined && b !== undefined && shareASide(a, b);
}
