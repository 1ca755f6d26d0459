import type { PinListColumns } from "@/lib/calc/netlist";
import type { Table } from "@/lib/pin-map-file/split-table";

export const LIST_COLUMNS = ["net", "part", "pin", "x", "y"] as const satisfies readonly (keyof PinListColumns)[];
export type ListColumn = (typeof LIST_COLUMNS)[number];

/** What each column of the file is; "" is left out. */
export type ListMapping = readonly (ListColumn | "")[];

/** Headings as people and programs write them, in small letters without blanks and signs. */
const WORDINGS: Record<ListColumn, readonly string[]> = {
  net: ["net", "netname", "signal", "signalname", "node", "nodename"],
  part: ["part", "ref", "refdes", "reference", "designator", "component", "connector"],
  pin: ["pin", "pinno", "pinnumber", "pinname", "pad", "padname", "padnumber", "contact", "terminal"],
  x: ["x", "xmm", "xmil", "xinch", "posx", "xpos", "centerx", "xcoord"],
  y: ["y", "ymm", "ymil", "yinch", "posy", "ypos", "centery", "ycoord"],
};

const plain = (heading: string) => heading.toLowerCase().replace(/[^\p{L}\p{N}]+/gu, "");

const columnOf = (heading: string): ListColumn | undefined => {
  const word = plain(heading);
  return LIST_COLUMNS.find((column) => WORDINGS[column].includes(word));
};

/** Without headings the usual order is taken: net, part, pin, x, y, or net and pin where there are two columns. */
export function guessPinColumns({ rows }: Table): { hasHeadings: boolean; mapping: ListMapping } {
  const width = Math.max(...rows.map(({ cells }) => cells.length));
  const found = rows[0]?.cells.map(columnOf) ?? [];
  const hasHeadings = found.includes("net") && found.includes("pin");
  const usual: readonly ListColumn[] = width <= 2 ? ["net", "pin"] : LIST_COLUMNS;
  const taken = new Set<ListColumn>();
  const mapping = Array.from({ length: width }, (_, at): ListColumn | "" => {
    const column = hasHeadings ? found[at] : usual[at];
    if (!column || taken.has(column)) return "";
    taken.add(column);
    return column;
  });
  return { hasHeadings, mapping };
}

/** Undefined while the net or the pin has no column. */
export function columnsOf(mapping: ListMapping): PinListColumns | undefined {
  const at = (column: ListColumn) => {
    const index = mapping.indexOf(column);
    return index === -1 ? null : index;
  };
  const [net, pin] = [at("net"), at("pin")];
  return net === null || pin === null ? undefined : { net, part: at("part"), pin, x: at("x"), y: at("y") };
}
