/** Beyond so many rings of cells the search gives up and takes any place that is left, so that the work stays bounded. */
const MOST_RINGS = 12;

/** In a crowded cell not all are looked at, for the same reason. */
const MOST_IN_A_CELL = 48;

/** Places in cells of about two each, for the nearest one that is not taken yet, or one nearly so. */
export class BucketGrid {
  private readonly left: number;
  private readonly low: number;
  private readonly size: number;
  private readonly columns: number;
  private readonly rows: number;
  /** First slot of every cell, and how many of its slots are still filled. */
  private readonly first: Int32Array;
  private readonly filled: Int32Array;
  private readonly slots: Int32Array;
  private readonly slotOf: Int32Array;
  private readonly cellOf: Int32Array;
  private cursor = 0;

  /** All places must be known. */
  constructor(
    private readonly x: Float64Array,
    private readonly y: Float64Array,
  ) {
    const count = x.length;
    const [left, right, low, high] = bounds(x, y);
    [this.left, this.low] = [left, low];
    const [wide, tall] = [right - left, high - low];
    this.size = Math.max(Math.sqrt((wide * tall * 2) / count), (2 * Math.max(wide, tall)) / count, 1e-6);
    this.columns = Math.floor(wide / this.size) + 1;
    this.rows = Math.floor(tall / this.size) + 1;
    const cells = this.columns * this.rows;
    this.first = new Int32Array(cells + 1);
    this.filled = new Int32Array(cells);
    this.slots = new Int32Array(count);
    this.slotOf = new Int32Array(count);
    this.cellOf = new Int32Array(count);
    for (let at = 0; at < count; at += 1) {
      const cell = this.row(y[at] ?? 0) * this.columns + this.column(x[at] ?? 0);
      this.cellOf[at] = cell;
      this.first[cell + 1] = (this.first[cell + 1] ?? 0) + 1;
    }
    for (let cell = 0; cell < cells; cell += 1) {
      this.first[cell + 1] = (this.first[cell + 1] ?? 0) + (this.first[cell] ?? 0);
    }
    for (let at = 0; at < count; at += 1) {
      const cell = this.cellOf[at] ?? 0;
      const slot = (this.first[cell] ?? 0) + (this.filled[cell] ?? 0);
      this.filled[cell] = (this.filled[cell] ?? 0) + 1;
      this.slots[slot] = at;
      this.slotOf[at] = slot;
    }
  }

  take(at: number): void {
    const cell = this.cellOf[at] ?? 0;
    const lastSlot = (this.first[cell] ?? 0) + (this.filled[cell] ?? 0) - 1;
    const [slot, last] = [this.slotOf[at] ?? 0, this.slots[lastSlot] ?? 0];
    this.slots[slot] = last;
    this.slotOf[last] = slot;
    this.slots[lastSlot] = at;
    this.slotOf[at] = lastSlot;
    this.filled[cell] = (this.filled[cell] ?? 0) - 1;
  }

  /** -1 when all are taken. */
  nearest(x: number, y: number): number {
    const [column, row] = [this.column(x), this.row(y)];
    let best = -1;
    let bestSquared = Infinity;
    for (let ring = 0; ring <= MOST_RINGS; ring += 1) {
      const reach = (ring - 1) * this.size;
      if (best >= 0 && ring > 0 && bestSquared <= reach * reach) return best;
      const [top, bottom] = [row + ring, row - ring];
      if (bottom < 0 && top >= this.rows && column - ring < 0 && column + ring >= this.columns) break;
      for (let r = Math.max(bottom, 0); r <= Math.min(top, this.rows - 1); r += 1) {
        const step = r === top || r === bottom ? 1 : Math.max(1, 2 * ring);
        for (let c = column - ring; c <= column + ring; c += step) {
          if (c < 0 || c >= this.columns) continue;
          const cell = r * this.columns + c;
          const begin = this.first[cell] ?? 0;
          const end = begin + Math.min(this.filled[cell] ?? 0, MOST_IN_A_CELL);
          for (let slot = begin; slot < end; slot += 1) {
            const at = this.slots[slot] ?? 0;
            const [dx, dy] = [(this.x[at] ?? 0) - x, (this.y[at] ?? 0) - y];
            const squared = dx * dx + dy * dy;
            if (squared < bestSquared) [best, bestSquared] = [at, squared];
          }
        }
      }
    }
    return best >= 0 ? best : this.anyLeft();
  }

  /** The first cell, row by row, that still holds one; cells never fill again. */
  private anyLeft(): number {
    while (this.cursor < this.filled.length && (this.filled[this.cursor] ?? 0) === 0) this.cursor += 1;
    return this.cursor < this.filled.length ? (this.slots[this.first[this.cursor] ?? 0] ?? -1) : -1;
  }

  private column = (x: number) => Math.min(Math.max(Math.floor((x - this.left) / this.size), 0), this.columns - 1);
  private row = (y: number) => Math.min(Math.max(Math.floor((y - this.low) / this.size), 0), this.rows - 1);
}

function bounds(x: Float64Array, y: Float64Array): [number, number, number, number] {
  let [left, right, low, high] = [Infinity, -Infinity, Infinity, -Infinity];
  for (let at = 0; at < x.length; at += 1) {
    const [px, py] = [x[at] ?? 0, y[at] ?? 0];
    if (px < left) left = px;
    if (px > right) right = px;
    if (py < low) low = py;
    if (py > high) high = py;
  }
  return [left, right, low, high];
}
