import { BARE_PIN } from "./bare-pin";
import { LineNotes } from "./line-notes";
import { NetCollector } from "./net-collector";
import type { Netlist, NetPoint } from "./netlist";
import { isNoNet } from "./no-net";
import { pinKey, pinName } from "./pin-name";
import type { NetlistReading } from "./reading";

/** A row that was split at its delimiters, with the line on which it begins. */
export type PinListRow = { line: number; cells: readonly string[] };

/** Which column holds what, from 0. Without one for the part the pin's column holds both: "U1-3", "U1.3", "J1 a4". */
export type PinListColumns = {
  net: number;
  part: number | null;
  pin: number;
  x: number | null;
  y: number | null;
};

export type PinListUnit = "mm" | "mil" | "inch";

/** The columns of writePinList. */
export const PIN_LIST_COLUMNS: PinListColumns = { net: 0, part: 1, pin: 2, x: 3, y: 4 };
export const PIN_LIST_HEADER = ["net", "part", "pin", "x (mm)", "y (mm)"] as const;

const MM: Record<PinListUnit, readonly [number, number]> = { mm: [1, 1], mil: [254, 10_000], inch: [254, 10] };
const NUMBER = /^[+\-\u2212]?(?:\d{1,9}(?:[.,]\d*)?|[.,]\d+)(?:e[+-]?\d{1,2})?$/i;
const BOTH = /^([^\s.:/-]+)[\s.:/-]+(\S.*)$/;

/**
 * A netlist from rows of net, part and pin, with places if there are some. A blank net and N/C are no net. A row that names
 * no pin, a pin that stands in the list already, and a place that is no figure are passed over, each by its line.
 */
export function readPinList(
  rows: readonly PinListRow[],
  columns: PinListColumns,
  { unit = "mm" }: { unit?: PinListUnit } = {},
): NetlistReading {
  const [passedOver, warnings] = [new LineNotes(), new LineNotes()];
  const nets = new NetCollector();
  const taken = new Map<string, { net: string; line: number }>();
  let hasPlaces = false;
  for (const { line, cells } of rows) {
    const cell = (at: number | null) => (at === null ? "" : (cells[at] ?? "").trim());
    if (cells.every((text) => text.trim() === "")) continue;
    const named = readName(cell(columns.part), cell(columns.pin), columns.part === null);
    if (typeof named === "string") {
      passedOver.add(line, named);
      continue;
    }
    const word = cell(columns.net);
    const net = isNoNet(word) ? "" : word;
    const before = taken.get(pinKey(named));
    if (before) {
      passedOver.add(line, repeated(pinName(named), net, before));
      continue;
    }
    taken.set(pinKey(named), { net, line });
    const place = readPlace(cell(columns.x), cell(columns.y), unit);
    if (typeof place === "string") warnings.add(line, place);
    const { xMm, yMm } = typeof place === "string" ? { xMm: null, yMm: null } : place;
    hasPlaces ||= xMm !== null;
    nets.add(net, { ...BARE_PIN, ...named, xMm, yMm, line });
  }
  if (taken.size === 0) warnings.add(0, "The list holds no pin that can be used.");
  const netlist: Netlist = {
    source: "pin-list",
    nets: nets.finish(),
    unconnected: nets.unconnected,
    adjacent: [],
    outlines: [],
    toolingHoles: [],
    places: hasPlaces ? "board" : "none",
    facts: [],
  };
  const read = [
    { what: "nets", count: netlist.nets.length },
    { what: "pins", count: taken.size },
    { what: "unconnected pins", count: netlist.unconnected.length },
  ];
  return { netlist, passedOver: passedOver.finish(), warnings: warnings.finish(), read };
}

/** Rows for a delimited file, in the columns of PIN_LIST_COLUMNS, without the header. Points of no part are left out. */
export function writePinList({ nets, unconnected }: Netlist): string[][] {
  const row = (net: string, { part, pin, xMm, yMm }: NetPoint) => [net, part, pin, figure(xMm), figure(yMm)];
  const isNamed = ({ part, pin }: NetPoint) => part !== "" && pin !== "";
  return [
    ...nets.flatMap(({ name, points }) => points.filter(isNamed).map((point) => row(name, point))),
    ...unconnected.filter(isNamed).map((point) => row("", point)),
  ];
}

const figure = (value: number | null) => (value === null ? "" : String(value));

function readName(part: string, pin: string, isTogether: boolean): { part: string; pin: string } | string {
  if (pin === "") return "The row names no pin.";
  if (!isTogether) return part === "" ? "The row names no part." : { part, pin };
  const [, own, rest] = BOTH.exec(pin) ?? [];
  return own === undefined || rest === undefined
    ? `“${pin}” is not a part and a pin, such as U1-3.`
    : { part: own, pin: rest };
}

function repeated(pin: string, net: string, before: { net: string; line: number }): string {
  return net === before.net
    ? `${pin} stands in line ${before.line} already.`
    : `${pin} belongs to ${before.net === "" ? "no net" : before.net} already (line ${before.line}).`;
}

function readPlace(x: string, y: string, unit: PinListUnit): { xMm: number | null; yMm: number | null } | string {
  if (x === "" && y === "") return { xMm: null, yMm: null };
  const [xMm, yMm] = [readMm(x, unit), readMm(y, unit)];
  if (xMm !== undefined && yMm !== undefined) return { xMm, yMm };
  return `“${xMm === undefined ? x : y}” is no place${x === "" || y === "" ? "; both X and Y are needed" : ""}.`;
}

function readMm(text: string, unit: PinListUnit): number | undefined {
  if (!NUMBER.test(text)) return undefined;
  const [numerator, denominator] = MM[unit];
  // Adding 0 makes one zero of both.
  return (Number(text.replace(",", ".").replace("\u2212", "-")) * numerator) / denominator + 0;
}
