import type { PointBook } from "./point-book";

/** Pairs of nets, each once, with the two points that lie nearest to each other. */
export class NetPairs {
  readonly a: number[] = [];
  readonly b: number[] = [];
  private readonly gaps: number[] = [];
  private readonly at = new Map<number, number>();

  constructor(private readonly book: Pick<PointBook, "netOf" | "nets">) {}

  /** Two points of different nets, `gap` apart (squared or not, as long as all are alike). */
  add(one: number, other: number, gap: number): void {
    const [a, b] = [this.book.netOf[one] ?? 0, this.book.netOf[other] ?? 0];
    const key = a < b ? a * this.book.nets + b : b * this.book.nets + a;
    const known = this.at.get(key);
    if (known === undefined) {
      this.at.set(key, this.a.length);
      this.a.push(one);
      this.b.push(other);
      this.gaps.push(gap);
    } else if (gap < (this.gaps[known] ?? Infinity)) {
      this.a[known] = one;
      this.b[known] = other;
      this.gaps[known] = gap;
    }
  }

  get size(): number {
    return this.a.length;
  }

  /** By numbers of nets. */
  has(one: number, other: number): boolean {
    return this.at.has(one < other ? one * this.book.nets + other : other * this.book.nets + one);
  }
}
