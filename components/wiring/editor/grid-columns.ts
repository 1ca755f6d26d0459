import { COLUMN_NAMES, PIN_COLUMNS, type PinColumn } from "@/lib/pin-map/pin-columns";
import { placeOf } from "../grid/table-text";

/** What stands where in the drawn table: the pin, the typed columns, and what the net says, which nobody types. */
export type DrawnColumn = { id: PinColumn | "pin" | "net"; heading: string; place: number | undefined; width: string };

const WIDTHS: Record<PinColumn, string> = {
  signal: "7.25rem",
  role: "8.25rem",
  family: "3.75rem",
  loads: "3.25rem",
  enableGroup: "5rem",
  pullUpOhm: "4.4rem",
  note: "12rem",
};

const typed = PIN_COLUMNS.map((column): DrawnColumn => ({
  id: column,
  heading: column === "enableGroup" ? "Group" : COLUMN_NAMES[column],
  place: placeOf(column),
  width: WIDTHS[column],
}));

/** Notes are long and looked at last: the net's column stands before them. */
export const drawnColumns = (pinWidth: string): DrawnColumn[] => [
  { id: "pin", heading: "Pin", place: 0, width: pinWidth },
  ...typed.filter(({ id }) => id !== "note"),
  { id: "net", heading: "Driven by", place: undefined, width: "minmax(6.5rem, 1fr)" },
  ...typed.filter(({ id }) => id === "note"),
];

export const templateOf = (columns: readonly DrawnColumn[]): string => columns.map(({ width }) => width).join(" ");
