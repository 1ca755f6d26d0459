/** Union-find with path halving and union by size: near-linear in the number of joins (Tarjan). */
export class DisjointSets {
  private readonly parent: Int32Array;
  private readonly size: Int32Array;

  constructor(count: number) {
    this.parent = Int32Array.from({ length: count }, (_, at) => at);
    this.size = new Int32Array(count).fill(1);
  }

  find(member: number): number {
    let at = member;
    for (;;) {
      const up = this.parent[at] ?? at;
      if (up === at) return at;
      const next = this.parent[up] ?? up;
      this.parent[at] = next;
      at = next;
    }
  }

  join(one: number, other: number): void {
    const [a, b] = [this.find(one), this.find(other)];
    if (a === b) return;
    const [sizeA, sizeB] = [this.size[a] ?? 1, this.size[b] ?? 1];
    const [root, leaf] = sizeA >= sizeB ? [a, b] : [b, a];
    this.parent[leaf] = root;
    this.size[root] = sizeA + sizeB;
  }
}
