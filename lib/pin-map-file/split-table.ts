import Papa from "papaparse";
import { unescapeCell } from "@/lib/pin-map/cell-escape";

export const DELIMITERS = { tab: "\t", semicolon: ";", comma: "," } as const;
export type Delimiter = keyof typeof DELIMITERS;

/** One row with the line of the file on which it begins, counted from 1. */
export type TableRow = { line: number; cells: string[] };

export type Table = { delimiter: Delimiter; rows: TableRow[] };
export type SplitTable = { ok: true; table: Table } | { ok: false; sentence: string };

export const MOST_TABLE_ROWS = 10_000;

/**
 * Splits RFC 4180 and what programs make of it: semicolons or tabs for commas, a byte order mark, CRLF, CR or LF, blank
 * lines, separators after the last cell, quotes that are doubled, open or out of place. Apostrophes that keep a cell
 * from being taken for a formula are taken off again.
 */
export function splitTable(text: string, delimiter?: Delimiter, most = MOST_TABLE_ROWS): SplitTable {
  const plain = text.replace(/^\ufeff/, "").replace(/\r\n?/g, "\n");
  const chosen = delimiter ?? guessDelimiter(plain);
  const rows: TableRow[] = [];
  let line = 1;
  let from = 0;
  let openQuote: number | undefined;
  Papa.parse<string[]>(plain, {
    delimiter: DELIMITERS[chosen],
    newline: "\n",
    step: ({ data, errors, meta }) => {
      if (errors.some((error) => error.code === "MissingQuotes")) openQuote ??= line;
      const cells = trimEnd(data.map((cell) => unescapeCell(cell.trim())));
      if (cells.length > 0) rows.push({ line, cells });
      line += countLines(plain, from, meta.cursor);
      from = meta.cursor;
    },
  });
  if (openQuote !== undefined) {
    return {
      ok: false,
      sentence: `A quotation mark opens in line ${openQuote} and never closes. Close it or take it out.`,
    };
  }
  if (rows.length === 0) return { ok: false, sentence: "There is no row in this file." };
  if (rows.length > most + 1) {
    return {
      ok: false,
      sentence: `The file has ${rows.length.toLocaleString("en-GB")} rows; at most ${most.toLocaleString("en-GB")} are taken at once. Split it by board.`,
    };
  }
  return { ok: true, table: { delimiter: chosen, rows } };
}

function countLines(text: string, from: number, to: number): number {
  let count = 0;
  for (let at = text.indexOf("\n", from); at !== -1 && at < to; at = text.indexOf("\n", at + 1)) count += 1;
  return count;
}

/** Cells after the last one with a word in it are what a trailing separator leaves. */
function trimEnd(cells: string[]): string[] {
  let length = cells.length;
  while (length > 0 && cells[length - 1] === "") length -= 1;
  return cells.slice(0, length);
}

/** The one that most lines of the beginning have outside of quotes, and equally often; a tab before the others. */
function guessDelimiter(text: string): Delimiter {
  const lines = text
    .split("\n", 60)
    .map((line) => line.replace(/"(?:[^"]|"")*"/g, ""))
    .filter((line) => line.trim() !== "");
  const score = (delimiter: Delimiter) => {
    const counts = lines.map((line) => line.split(DELIMITERS[delimiter]).length - 1).filter((count) => count > 0);
    const usual = counts.sort((a, b) => a - b)[Math.floor(counts.length / 2)] ?? 0;
    return counts.filter((count) => Math.abs(count - usual) <= 1).length;
  };
  const order: Delimiter[] = ["tab", "semicolon", "comma"];
  return order.reduce((best, one) => (score(one) > score(best) ? one : best));
}
