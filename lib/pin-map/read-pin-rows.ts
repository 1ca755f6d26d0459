import { pinNamed, type Connector } from "@/lib/calc/connector";
import { COLUMN_NAMES, isEmptyRow, type PinTexts } from "./pin-columns";
import type { KnownNames } from "./read-cell";
import { readPinRow, type PinValues } from "./read-pin-row";

export type TypedRow = PinTexts & { pin: string };
type Face = {
  reference: string;
  face: Connector;
  /** Pins that rows are kept of, also where the face lost them. */ kept: readonly string[];
};

/** What to put, what to take away, and what is wrong: a sentence by "pin.column", each naming both. */
export type ReadRows = { put: PinValues[]; take: string[]; problems: Record<string, string> };

/** Reads rows against the face: pins by their own writing, each once; an empty row takes the pin's row away. */
export function readPinRows(rows: readonly TypedRow[], { reference, face, kept }: Face, known: KnownNames): ReadRows {
  const read: ReadRows = { put: [], take: [], problems: {} };
  const seen = new Set<string>();
  for (const row of rows) {
    const name = pinNamed(face, row.pin)?.name;
    const pin = name ?? row.pin;
    if (seen.has(pin)) {
      read.problems[`${pin}.pin`] = `${pin} stands in two rows. Keep one of them.`;
      continue;
    }
    seen.add(pin);
    if (isEmptyRow(row)) {
      if (kept.includes(pin)) read.take.push(pin);
      continue;
    }
    if (name === undefined) {
      const what = COLUMN_NAMES[row.signal === "" ? "role" : "signal"].toLowerCase();
      read.problems[`${pin}.pin`] = `${reference} has no pin ${pin}. Move its ${what} to a pin of ${face.label}.`;
      continue;
    }
    const values = readPinRow(name, row, known);
    if (values.ok) read.put.push(values.value);
    else for (const { column, sentence } of values.problems) read.problems[`${name}.${column}`] = sentence;
  }
  return read;
}
