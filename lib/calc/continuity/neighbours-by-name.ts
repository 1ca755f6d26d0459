import type { NetPairs } from "./net-pairs";
import type { PointBook } from "./point-book";

/** Pin names of packages leave out letters that can be taken for figures or for each other. */
const LEFT_OUT = new Set("GIOQSXZ");
/** Parts whose pins are counted across two rows: pin 1 stands beside 2 and 3. Others are counted along their edge. */
const CONNECTOR = /^(?:J|P|X|K|CN|CON|JP|SV|ST|PL|SK)\d/i;
const NAME = /^([A-Za-z]*)(\d*)$/;

/**
 * Pairs of nets on pins that stand beside each other by their names, part by part, for pins whose place is not known: 7 beside
 * 8 (on connectors beside 9, too), b4 beside b5 and c4, D beside E. Rows that follow each other in the alphabet lie
 * side by side; a and c alone do not. Names of another form have no neighbours.
 */
export function neighboursByName(book: PointBook, chosen: readonly number[], pairs: NetPairs): void {
  const parts = new Map<string, Map<string, number>>();
  for (const at of chosen) {
    const point = book.points[at];
    if (!point || point.part === "" || !Number.isNaN(book.x[at])) continue;
    const pins = parts.get(point.part) ?? new Map<string, number>();
    if (pins.size === 0) parts.set(point.part, pins);
    pins.set(point.pin.toUpperCase(), at);
  }
  for (const [part, pins] of parts) {
    const isConnector = CONNECTOR.test(part);
    for (const [pin, at] of pins) {
      for (const name of namesBeside(pin, isConnector)) {
        const other = pins.get(name);
        if (other !== undefined && book.netOf[at] !== book.netOf[other]) pairs.add(at, other, 0);
      }
    }
  }
}

/** Those that follow; the ones before say it from their side. */
function namesBeside(pin: string, isConnector: boolean): string[] {
  const [, letters = "", digits = ""] = NAME.exec(pin) ?? [];
  const next = (step: number) => String(Number(digits) + step);
  if (letters === "") return digits === "" ? [] : isConnector ? [next(1), next(2)] : [next(1)];
  const beside = lettersAfter(letters).map((row) => `${row}${digits}`);
  return digits === "" ? beside : [`${letters}${next(1)}`, ...beside];
}

/** "B" after "A"; "J" and "H" after "G", since I is left out in most names but not in all. */
function lettersAfter(letters: string): string[] {
  const last = letters.charCodeAt(letters.length - 1);
  const found: string[] = [];
  for (let code = last + 1; code <= "Z".charCodeAt(0); code += 1) {
    const letter = String.fromCharCode(code);
    found.push(letters.slice(0, -1) + letter);
    if (!LEFT_OUT.has(letter)) break;
  }
  return found;
}
