import Papa from "papaparse";
import { escapeCell, unescapeCell } from "@/lib/pin-map/cell-escape";

/**
 * The block of cells that a spreadsheet puts on the clipboard: tabs between cells, a line a row with any line end,
 * quotes round a cell with a tab, a line end or a quote in it. Every row gets as many cells as the longest.
 */
export function parseTsv(text: string): string[][] {
  const body = text.replace(/^\uFEFF/, "").replace(/\r\n?/g, "\n");
  const read = Papa.parse<string[]>(body, { delimiter: "\t", newline: "\n", quoteChar: '"' });
  // A quote that is never closed is a plain character (5" lead): the text is then split as it stands.
  const hasStrayQuote = read.errors.some(({ type }) => type === "Quotes");
  const rows = hasStrayQuote ? body.split("\n").map((line) => line.split("\t")) : read.data;
  const last = rows.at(-1);
  if (rows.length > 1 && last?.length === 1 && last[0] === "") rows.pop();
  const width = rows.reduce((most, row) => Math.max(most, row.length), 0);
  return rows.map((row) => Array.from({ length: width }, (_, column) => cleanCell(row[column] ?? "")));
}

/** A line end inside a cell is a blank here: every cell of the table is one line. */
const cleanCell = (cell: string): string =>
  unescapeCell(cell)
    .replace(/[\n\t]+/g, " ")
    .trim();

/** The same the other way; formula-looking cells are escaped. */
export const writeTsv = (rows: readonly (readonly string[])[]): string =>
  Papa.unparse(
    rows.map((row) => row.map(escapeCell)),
    { delimiter: "\t", newline: "\n" },
  );
