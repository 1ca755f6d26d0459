import type { Outline, Place } from "../netlist";

const KINDS: Record<string, Outline["kind"]> = { BOARD_EDGE: "board", PANEL_EDGE: "panel", SCORE_LINE: "score" };

const COORDINATE = /^(?:X([+-]?\d{1,9}))?(?:Y([+-]?\d{1,9}))?$/;

/** The size of the pen: at most four digits an axis, without a sign. A bare zero is a place. */
const PEN = /^X(?!0+(?:Y0*)?$)\d{1,4}(?:Y\d{1,4})?$/;

/**
 * Edges from records 389 and 089: the pen's size, then places divided by blanks; an axis that does not change may be left out,
 * and an asterisk begins a new chain.
 */
export class OutlineReader {
  readonly outlines: Outline[] = [];
  private paths: Place[][] | undefined;
  private xMm = 0;
  private yMm = 0;

  /** A sentence when something in the record is no place. */
  begin(line: string, toMm: (value: number) => number): string | undefined {
    const kind = KINDS[line.slice(3, 17).trim().toUpperCase()] ?? "other";
    this.paths = [[]];
    this.outlines.push({ kind, paths: this.paths });
    [this.xMm, this.yMm] = [0, 0];
    const text = line.slice(17).trim();
    const [first = ""] = text.split(/\s+/, 1);
    return this.take(PEN.test(first) ? text.slice(first.length) : text, toMm);
  }

  goOn(line: string, toMm: (value: number) => number): string | undefined {
    return this.paths ? this.take(line.slice(3), toMm) : "Continues an outline, but none has begun.";
  }

  finish(): Outline[] {
    return this.outlines
      .map(({ kind, paths }) => ({ kind, paths: paths.filter((path) => path.length > 1) }))
      .filter(({ paths }) => paths.length > 0);
  }

  private take(text: string, toMm: (value: number) => number): string | undefined {
    const strange: string[] = [];
    text.split("*").forEach((chain, at) => {
      if (at > 0) this.paths?.push([]);
      for (const word of chain.split(/\s+/)) {
        if (word === "") continue;
        const [found, x, y] = COORDINATE.exec(word) ?? [];
        if (found === undefined) {
          strange.push(word);
          continue;
        }
        if (x !== undefined) this.xMm = toMm(Number(x));
        if (y !== undefined) this.yMm = toMm(Number(y));
        this.paths?.at(-1)?.push({ xMm: this.xMm, yMm: this.yMm });
      }
    });
    return strange.length === 0 ? undefined : `“${strange.slice(0, 3).join(" ")}” is no place on an outline.`;
  }
}
