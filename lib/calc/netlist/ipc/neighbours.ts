import type { NetPair } from "../netlist";

/** Records 379 and 079: a net, then the nets beside it; each pair is said from one side only. */
export class NeighbourReader {
  private readonly pairs: { one: string; other: string; line: number }[] = [];
  private net: string | undefined;

  begin(line: string, number: number): void {
    const [net, ...others] = words(line);
    this.net = net;
    this.take(others, number);
  }

  /** A sentence when there is nothing to continue. */
  goOn(line: string, number: number): string | undefined {
    if (this.net === undefined) return "Continues a list of neighbours, but none has begun.";
    this.take(words(line), number);
    return undefined;
  }

  /** Pairs of nets that exist, by their full names. `resolve` answers undefined for a name that no point has. */
  finish(resolve: (name: string) => string | undefined, warn: (line: number, reason: string) => void): NetPair[] {
    const found = new Map<string, NetPair>();
    for (const { one, other, line } of this.pairs) {
      const [a, b] = [resolve(one), resolve(other)];
      if (a === undefined || b === undefined) {
        warn(line, `${a === undefined ? one : other} is named as a neighbour, but no point belongs to it.`);
      } else if (a !== b) {
        const [first, second] = a < b ? [a, b] : [b, a];
        found.set(`${first}\n${second}`, { one: first, other: second });
      }
    }
    return [...found.values()];
  }

  private take(others: readonly string[], line: number): void {
    for (const other of others) this.pairs.push({ one: this.net ?? "", other, line });
  }
}

const words = (line: string) => line.slice(3).split(/\s+/).filter(Boolean);
