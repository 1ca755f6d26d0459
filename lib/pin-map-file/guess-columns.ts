import type { PinColumn } from "@/lib/pin-map/pin-columns";
import type { Table } from "./split-table";

/** What a column of the file is; "" is left out. */
export const FILE_COLUMNS = [
  "board",
  "connector",
  "pin",
  "signal",
  "role",
  "family",
  "loads",
  "enableGroup",
  "pullUpOhm",
  "note",
] as const satisfies readonly (PinColumn | "board" | "connector" | "pin")[];
export type FileColumn = (typeof FILE_COLUMNS)[number];

/** One entry a column of the file. */
export type Mapping = readonly (FileColumn | "")[];

/** Headings as people and programs write them, in small letters without blanks and signs. */
const WORDINGS: Record<FileColumn, readonly string[]> = {
  board: ["board", "card", "module", "pcb", "boardcode"],
  connector: [
    "connector",
    "conn",
    "plug",
    "socket",
    "header",
    "reference",
    "ref",
    "refdes",
    "designator",
    "slot",
    "where",
  ],
  pin: ["pin", "pinno", "pinnr", "pinnumber", "pinname", "contact", "contactno", "position", "pos", "terminal", "pad"],
  signal: ["signal", "signalname", "net", "netname", "name", "function", "line", "label"],
  role: ["role", "type", "pintype", "direction", "dir", "io", "electricaltype", "driver", "kind"],
  family: ["family", "logic", "logicfamily", "technology", "series"],
  loads: ["loads", "load", "unitloads", "fanin", "inputs", "numberofloads"],
  enableGroup: ["enablegroup", "enable", "group", "oe", "outputenable", "enabledby", "select"],
  pullUpOhm: ["pullup", "pullupresistor", "pullupohm", "pull", "rpullup", "rpu", "resistor", "r"],
  note: ["note", "notes", "comment", "comments", "remark", "remarks", "description", "text"],
};

const plain = (heading: string) =>
  heading
    .toLowerCase()
    .replace(/\(.*?\)/g, "")
    .replace(/[^\p{L}\p{N}]+/gu, "");

const columnOf = (heading: string): FileColumn | undefined => {
  const word = plain(heading);
  return FILE_COLUMNS.find((column) => WORDINGS[column].includes(word));
};

/** Whether the first row names the columns, and what each column is; a person corrects both. */
export function guessColumns(
  { rows }: Table,
  isPin: (cell: string) => boolean,
): { hasHeadings: boolean; mapping: Mapping } {
  const width = Math.max(...rows.map(({ cells }) => cells.length));
  const [first] = rows;
  const headings = first?.cells.map(columnOf) ?? [];
  const hasHeadings = headings.includes("pin") || (headings.includes("signal") && headings.filter(Boolean).length > 1);
  if (!hasHeadings) return { hasHeadings, mapping: guessByContent(rows, width, isPin) };
  const taken = new Set<FileColumn>();
  const mapping = Array.from({ length: width }, (_, at): FileColumn | "" => {
    const column = headings[at];
    if (!column || taken.has(column)) return "";
    taken.add(column);
    return column;
  });
  return { hasHeadings, mapping };
}

/** Without headings: the column whose cells are pins, and the signal in the next one. */
function guessByContent(rows: Table["rows"], width: number, isPin: (cell: string) => boolean): Mapping {
  const head = rows.slice(0, 200);
  const hits = Array.from({ length: width }, (_, at) => head.filter(({ cells }) => isPin(cells[at] ?? "")).length);
  const most = Math.max(...hits);
  const pin = most > 0 ? hits.indexOf(most) : 0;
  const signal = pin + 1 < width ? pin + 1 : pin - 1;
  return Array.from({ length: width }, (_, at): FileColumn | "" =>
    at === pin ? "pin" : at === signal ? "signal" : "",
  );
}
