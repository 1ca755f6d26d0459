import type { ReactNode } from "react";

export type TableColumn<Row> = {
  id: string;
  header: string;
  cell: (row: Row) => ReactNode;
  /** With it the column sorts. Null and undefined go last, whichever way it is sorted. */
  sortBy?: (row: Row) => string | number | boolean | null | undefined;
  /** Text that the search finds; `sortBy` when it is text and this is not given. */
  searchIn?: (row: Row) => string;
  align?: "start" | "end";
  /** Figures, pins, serials. */
  mono?: boolean;
  /** CSS width, e.g. "8rem" or "40%". */
  width?: string;
  /** The cell that names the row for a screen reader; one a table. */
  isRowHeader?: boolean;
  /** Its header is only for assistive technology, e.g. a column of buttons or glyphs. */
  isHeaderHidden?: boolean;
  className?: string;
};

/** What the reader has made of the table; give it and `onViewChange` to keep it in the address. */
export type TableView = { sort: string | null; isDescending: boolean; search: string; page: number };

export const FIRST_VIEW: TableView = { sort: null, isDescending: false, search: "", page: 1 };
