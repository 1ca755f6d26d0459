import Papa from "papaparse";
import { escapeCell } from "@/lib/pin-map/cell-escape";
import { COLUMN_NAMES, EMPTY_TEXTS, PIN_COLUMNS } from "@/lib/pin-map/pin-columns";
import type { TakeTarget } from "./resolve-target";

const HEADINGS = ["Board", "Connector", "Pin", ...PIN_COLUMNS.map((column) => COLUMN_NAMES[column])];

/** Spreadsheets take a file without it for a single-byte code and spoil µ and Ω. */
const MARK = "\ufeff";

type Source = Pick<TakeTarget, "board" | "reference" | "face" | "kept">;

/**
 * The pin maps as RFC 4180 in UTF-8: a row for every pin of the face, empty ones too, so that the file can be filled in.
 * Cells that a spreadsheet would take for a formula get an apostrophe, which splitTable takes off again.
 */
export function composeFile(sources: readonly Source[]): string {
  const rows = sources.flatMap(({ board, reference, face, kept }) => {
    const onFace = face.pins.map(({ name }) => name);
    const strays = Object.keys(kept).filter((pin) => !onFace.includes(pin));
    return [...onFace, ...strays].map((pin) => {
      const texts = kept[pin] ?? EMPTY_TEXTS;
      return [board, reference, pin, ...PIN_COLUMNS.map((column) => texts[column])].map(escapeCell);
    });
  });
  return `${MARK}${Papa.unparse([HEADINGS, ...rows], { newline: "\r\n" })}\r\n`;
}
