import type { Entry } from "./schema";

const isTexts = (value: unknown): value is string[] =>
  Array.isArray(value) && value.every((one) => typeof one === "string");

export function isEntry(value: unknown): value is Entry {
  return (
    typeof value === "object" &&
    value !== null &&
    "cells" in value &&
    Array.isArray(value.cells) &&
    value.cells.every(isTexts)
  );
}

/** The entry with one cell written; rows and columns that an older draft lacks are made. */
export function withCell(
  entry: Entry,
  rows: number,
  columns: number,
  at: { row: number; column: number },
  typed: string,
): Entry {
  return {
    cells: Array.from({ length: rows }, (_, r) =>
      Array.from({ length: columns }, (_, c) =>
        r === at.row && c === at.column ? typed : (entry.cells[r]?.[c] ?? ""),
      ),
    ),
  };
}
