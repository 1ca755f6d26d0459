import type { NetPoint } from "../netlist";

/** Points with the access code of each: 0 both sides, 1 the primary one, n layer n. */
export class AccessBook {
  private readonly points: NetPoint[] = [];
  private readonly codes: (number | undefined)[] = [];
  private layers = 2;

  add(point: NetPoint, code: number | undefined): void {
    this.points.push(point);
    this.codes.push(code);
    if (code !== undefined && code > this.layers) this.layers = code;
  }

  /** A continuation of the last point: reached from two sides, it is reached from both. */
  join(code: number | undefined): void {
    const last = this.codes.length - 1;
    const before = this.codes[last];
    if (code === undefined || last < 0 || before === code) return;
    this.codes[last] = before === undefined ? code : 0;
    if (code > this.layers) this.layers = code;
  }

  /** The file does not say how many layers there are: the highest one with a point is the secondary side. */
  settle(): void {
    this.points.forEach((point, at) => {
      const code = this.codes[at];
      if (code === undefined) return;
      point.side = code === 0 ? "both" : code === 1 ? "primary" : code === this.layers ? "secondary" : "inner";
    });
  }
}
