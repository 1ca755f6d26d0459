import type { PointBook } from "./point-book";

/**
 * Pairs of nets, each once, with the two points that lie nearest to each other. A hash table of its own, because there are several
 * for every point of a large board.
 */
export class NetPairs {
  readonly a: number[] = [];
  readonly b: number[] = [];
  private readonly gaps: number[] = [];
  /** By place in the table: number of the pair, from 1; 0 is free. */
  private table = new Int32Array(1024);

  constructor(private readonly book: Pick<PointBook, "netOf">) {}

  get size(): number {
    return this.a.length;
  }

  /** Two points of different nets, `gap` apart (squared or not, as long as all are alike). */
  add(one: number, other: number, gap: number): void {
    const place = this.placeOf(this.net(one), this.net(other));
    const known = (this.table[place] ?? 0) - 1;
    if (known < 0) {
      this.table[place] = this.a.push(one);
      this.b.push(other);
      this.gaps.push(gap);
      if (this.a.length * 2 > this.table.length) this.grow();
    } else if (gap < (this.gaps[known] ?? Infinity)) {
      this.a[known] = one;
      this.b[known] = other;
      this.gaps[known] = gap;
    }
  }

  /** By numbers of nets. */
  has = (one: number, other: number): boolean => this.table[this.placeOf(one, other)] !== 0;

  /** Where the pair stands, or the free place where it would. */
  private placeOf(one: number, other: number): number {
    const low = one < other ? one : other;
    const high = one < other ? other : one;
    const mask = this.table.length - 1;
    const mixed = Math.imul(low, 0x9e3779b1) ^ Math.imul(high, 0x85ebca77);
    for (let place = (mixed ^ (mixed >>> 15)) & mask; ; place = (place + 1) & mask) {
      const pair = (this.table[place] ?? 0) - 1;
      if (pair < 0) return place;
      const first = this.net(this.a[pair] ?? 0);
      const second = this.net(this.b[pair] ?? 0);
      if ((first === low && second === high) || (first === high && second === low)) return place;
    }
  }

  private grow(): void {
    this.table = new Int32Array(this.table.length * 2);
    for (let pair = 0; pair < this.a.length; pair += 1) {
      this.table[this.placeOf(this.net(this.a[pair] ?? 0), this.net(this.b[pair] ?? 0))] = pair + 1;
    }
  }

  private net(point: number): number {
    return this.book.netOf[point] ?? 0;
  }
}
