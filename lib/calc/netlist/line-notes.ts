import type { LineNote } from "./reading";

const MOST_OF_A_KIND = 100;
const MOST = 1000;

/** Notes by line; of very many the first ones stay and the rest is counted, so that a strange file cannot fill the memory. */
export class LineNotes {
  private readonly notes: LineNote[] = [];
  private readonly counts = new Map<string, number>();
  private leftOut = 0;

  add(line: number, reason: string): void {
    if (this.notes.length >= MOST) {
      this.leftOut += 1;
      return;
    }
    const count = (this.counts.get(reason) ?? 0) + 1;
    this.counts.set(reason, count);
    if (count <= MOST_OF_A_KIND) this.notes.push({ line, reason });
  }

  finish(): LineNote[] {
    const more = [...this.counts]
      .filter(([, count]) => count > MOST_OF_A_KIND)
      .map(([reason, count]) => ({ line: 0, reason: `${count - MOST_OF_A_KIND} more lines: ${reason}` }));
    const rest = this.leftOut === 0 ? [] : [{ line: 0, reason: `${this.leftOut} more notes are not listed.` }];
    return [...this.notes.sort((a, b) => a.line - b.line), ...more, ...rest];
  }
}
