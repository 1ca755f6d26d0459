import { COLUMN_NAMES, EMPTY_TEXTS, PIN_COLUMNS, type PinColumn, type PinTexts } from "@/lib/pin-map/pin-columns";

/** One pin of one connector. */
export type PinKey = { connectorId: string; pin: string };

/** One cell that gets another text. */
export type CellChange = PinKey & { column: PinColumn; before: string; after: string };

/** What the editing functions need to know of the table that is shown. */
export type TableText = {
  rows: readonly PinKey[];
  textsAt: (row: number) => PinTexts;
  /** What stands in the first column: "a4", or "CON J1 a4" where several connectors are shown. */
  labelAt: (row: number) => string;
  /** The row that a text of the first column means. */
  rowNamed: (text: string) => number | undefined;
};

/** The first column names the pin and cannot be typed into. */
export const PIN_PLACE = 0;
export const TABLE_COLUMNS = PIN_COLUMNS.length + 1;
export const TYPED_PLACES: readonly number[] = PIN_COLUMNS.map((_, index) => index + 1);

export const columnAt = (place: number): PinColumn | undefined => PIN_COLUMNS[place - 1];
export const placeOf = (column: PinColumn): number => PIN_COLUMNS.indexOf(column) + 1;

export const headingAt = (place: number): string => {
  const column = columnAt(place);
  return column ? COLUMN_NAMES[column] : "Pin";
};

export const textAt = (table: TableText, row: number, place: number): string => {
  const column = columnAt(place);
  return column ? table.textsAt(row)[column] : table.labelAt(row);
};

/** The change of one cell, or none where the text stays, the cell cannot be typed into, or there is no such row. */
export function changeOf(table: TableText, row: number, place: number, after: string): CellChange[] {
  const key = table.rows[row];
  const column = columnAt(place);
  if (!key || !column) return [];
  const before = table.textsAt(row)[column];
  return before === after ? [] : [{ ...key, column, before, after }];
}

export const textsOf = (kept: PinTexts | undefined, typed: Partial<PinTexts> | undefined): PinTexts => ({
  ...(kept ?? EMPTY_TEXTS),
  ...typed,
});
