import { COLUMN_NAMES, PIN_COLUMNS, type PinColumn } from "@/lib/pin-map/pin-columns";
import { placeOf } from "../grid/table-text";

/** What stands where in the drawn table: the pin, the typed columns, and what the net says, which nobody types. */
export type DrawnColumn = { id: PinColumn | "pin" | "net"; heading: string; place: number | undefined; rem: number };

const WIDTHS: Record<PinColumn, number> = {
  signal: 7.25,
  role: 8.25,
  family: 3.75,
  loads: 3.25,
  enableGroup: 5,
  pullUpOhm: 4.4,
  note: 12,
};

const typed = PIN_COLUMNS.map((column): DrawnColumn => ({
  id: column,
  heading: column === "enableGroup" ? "Group" : COLUMN_NAMES[column],
  place: placeOf(column),
  rem: WIDTHS[column],
}));

/** Notes are long and looked at last: the net's column stands before them. */
export const drawnColumns = (pinRem: number): DrawnColumn[] => [
  { id: "pin", heading: "Pin", place: 0, rem: pinRem },
  ...typed.filter(({ id }) => id !== "note"),
  { id: "net", heading: "Driven by", place: undefined, rem: 6.5 },
  ...typed.filter(({ id }) => id === "note"),
];

export type RowShape = { gridTemplateColumns: string; width: string };

/** Every row by itself is as wide as all the others: the net's column alone takes what is left over. */
export const shapeOf = (columns: readonly DrawnColumn[]): RowShape => ({
  gridTemplateColumns: columns.map(({ id, rem }) => (id === "net" ? `minmax(${rem}rem, 1fr)` : `${rem}rem`)).join(" "),
  width: `max(100%, ${columns.reduce((sum, { rem }) => sum + rem, 0)}rem)`,
});
