import type { PointBook } from "./point-book";
import { halfSize, sidesOf } from "./reach";

/** Pads with a known place, as boxes in mm. */
export type Pads = {
  count: number;
  point: Int32Array;
  net: Int32Array;
  /** Sides on which it can be touched: 1 the primary one, 2 the secondary one, 3 both. */
  sides: Uint8Array;
  left: Float64Array;
  right: Float64Array;
  low: Float64Array;
  high: Float64Array;
  cell: number;
};

/** The boxes around the pads, each widened on all sides. */
export function measurePads(book: PointBook, chosen: readonly number[], widenMm: number): Pads {
  const most = chosen.length;
  const [left, right, low, high] = [space(most), space(most), space(most), space(most)];
  const [point, net, sides] = [new Int32Array(most), new Int32Array(most), new Uint8Array(most)];
  let count = 0;
  let sizes = 0;
  for (const at of chosen) {
    const [x, y, pad] = [book.x[at] ?? Number.NaN, book.y[at] ?? Number.NaN, book.points[at]];
    if (Number.isNaN(x) || !pad) continue;
    const [halfX, halfY] = halfSize(pad);
    point[count] = at;
    net[count] = book.netOf[at] ?? 0;
    sides[count] = sidesOf(pad);
    left[count] = x - halfX - widenMm;
    right[count] = x + halfX + widenMm;
    low[count] = y - halfY - widenMm;
    high[count] = y + halfY + widenMm;
    sizes += halfX + halfY;
    count += 1;
  }
  return {
    count,
    point,
    net,
    sides,
    left,
    right,
    low,
    high,
    cell: Math.max(2 * widenMm + sizes / Math.max(1, count), 0.01),
  };
}

const space = (count: number) => new Float64Array(count);

/** Entries by bucket; a bucket may hold more than one cell. */
export type Table = { first: Int32Array; pad: Int32Array; column: Int32Array; row: Int32Array };

/** A hash table of cells by counting: no memory for cells that are empty, however far apart the pads lie. */
export function fillTable(pads: Pads): Table {
  let buckets = 16;
  while (buckets < pads.count * 2) buckets *= 2;
  const mask = buckets - 1;
  const first = new Int32Array(buckets + 1);
  forEachCell(pads, (_, column, row) => {
    const bucket = hash(column, row) & mask;
    first[bucket + 1] = (first[bucket + 1] ?? 0) + 1;
  });
  for (let bucket = 0; bucket < buckets; bucket += 1) {
    first[bucket + 1] = (first[bucket + 1] ?? 0) + (first[bucket] ?? 0);
  }
  const total = first[buckets] ?? 0;
  const table = { first, pad: new Int32Array(total), column: new Int32Array(total), row: new Int32Array(total) };
  const next = first.slice();
  forEachCell(pads, (at, column, row) => {
    const bucket = hash(column, row) & mask;
    const slot = next[bucket] ?? 0;
    next[bucket] = slot + 1;
    table.pad[slot] = at;
    table.column[slot] = column;
    table.row[slot] = row;
  });
  return table;
}

function forEachCell(
  { count, left, right, low, high, cell }: Pads,
  take: (pad: number, column: number, row: number) => void,
) {
  for (let at = 0; at < count; at += 1) {
    const [lastColumn, lastRow] = [Math.floor((right[at] ?? 0) / cell), Math.floor((high[at] ?? 0) / cell)];
    for (let row = Math.floor((low[at] ?? 0) / cell); row <= lastRow; row += 1) {
      for (let column = Math.floor((left[at] ?? 0) / cell); column <= lastColumn; column += 1) take(at, column, row);
    }
  }
}

function hash(column: number, row: number): number {
  const mixed = Math.imul(column, 0x9e3779b1) ^ Math.imul(row, 0x85ebca77);
  return mixed ^ (mixed >>> 15);
}
